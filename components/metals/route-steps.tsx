import { RouteVariants } from "@/components/metals/route-variants";
import { StepColumn } from "@/components/metals/step-column";
import { Rests } from "@/components/ui/rests";
import type { PretreatmentRoute } from "@/lib/metals/pretreatment/route";

/** A base metal's route, drawn; below it the forms of the metal that are done otherwise, so that no page leaves them out. */
export function RouteSteps({ route }: { route: PretreatmentRoute }) {
  return (
    <div className="route">
      <StepColumn steps={route.steps} label={`Route for ${route.title.toLowerCase()}`} />
      <RouteVariants variants={route.variants} />
      <Rests>
        Common practice, not advice. Read each solution&apos;s safety data sheet first; local codes, permits and
        licensed practice come before this card.
      </Rests>
    </div>
  );
}
