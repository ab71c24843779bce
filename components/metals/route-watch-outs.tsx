import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import type { WatchOut } from "@/lib/metals/pretreatment/route";

/** What bites this metal, each with the picture of the fault that it ends in. */
export function RouteWatchOuts({ watchOuts }: { watchOuts: readonly WatchOut[] }) {
  return (
    <ul className="route-watch">
      {watchOuts.map((each) => (
        <li key={each.title}>
          <Glyph name={classGlyph(each.classSlug)} />
          <div>
            <strong>{each.title}</strong>
            <p>{each.words}</p>
            <p className="route-source">Source: {each.source}</p>
          </div>
        </li>
      ))}
    </ul>
  );
}
