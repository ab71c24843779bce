import Link from "next/link";
import { RouteSteps } from "@/components/metals/route-steps";
import { RouteVerdicts } from "@/components/metals/route-verdicts";
import { RouteWatchOuts } from "@/components/metals/route-watch-outs";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import type { BaseMetal } from "@/lib/cases/case-words";
import { metalInSentence } from "@/lib/cases/metal-words";
import { pretreatmentFor } from "@/lib/metals/pretreatment/pretreatment";
import { routes } from "@/lib/routes";

/** How the metal that fits is brought to the strike, what to watch for, and what does not suit it. */
export function CheckRoute({ baseMetal }: { baseMetal: BaseMetal }) {
  const route = pretreatmentFor(baseMetal);
  const metal = metalInSentence(baseMetal, null);
  if (!route) {
    return (
      <Section title="4. Route">
        <Note title="No route is written for this metal">Ask a senior tech before any solution touches it.</Note>
      </Section>
    );
  }
  return (
    <div className="check-route">
      <Section
        title={`4. Route, if it is ${metal}`}
        aside={<Link href={routes.metalRoute(baseMetal)}>In the library</Link>}
      >
        <p className="check-route__sum">{route.summary}</p>
        <RouteSteps route={route} />
      </Section>
      <div>
        <Section title="Watch out">
          <RouteWatchOuts watchOuts={route.watchOuts} />
        </Section>
        <Section title={`Activators on ${metal}`}>
          <RouteVerdicts {...route.activators} />
        </Section>
      </div>
    </div>
  );
}
