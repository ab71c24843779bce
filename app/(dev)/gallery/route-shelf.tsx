import { MetalTile } from "@/components/metals/metal-tile";
import { RouteSteps } from "@/components/metals/route-steps";
import { RouteVerdicts } from "@/components/metals/route-verdicts";
import { RouteWatchOuts } from "@/components/metals/route-watch-outs";
import { Section } from "@/components/ui/section";
import { pretreatmentFor } from "@/lib/metals/pretreatment/pretreatment";

/** A base metal's route and what belongs to it. */
export function RouteShelf() {
  const route = pretreatmentFor("zinc");
  if (!route) return null;
  return (
    <Section title="Route of a base metal">
      <div className="cols">
        <RouteSteps route={route} />
        <div className="stack">
          <MetalTile route={route} />
          <RouteWatchOuts watchOuts={route.watchOuts} />
          <RouteVerdicts {...route.strike} />
        </div>
      </div>
    </Section>
  );
}
