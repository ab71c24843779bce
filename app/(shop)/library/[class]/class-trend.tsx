import { TrendRow } from "@/components/library/class-trend";
import { Section } from "@/components/ui/section";
import { trendRests } from "@/lib/library/evidence-words";
import { routes } from "@/lib/routes";
import type { LoadedClass } from "./load-class";

/** How often the class came up in this shop. */
export function Trend({ loaded: { entry, trend, firstAt }, timeZone }: { loaded: LoadedClass; timeZone: string }) {
  return (
    <Section title="In this shop, month by month" id="trend" rests={trendRests(firstAt.any, timeZone)}>
      <TrendRow
        trend={trend}
        hrefFor={({ from, to }) => routes.casebook({ class: entry.slug, openedFrom: from, openedTo: to })}
      />
    </Section>
  );
}
