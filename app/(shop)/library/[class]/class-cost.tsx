import { SourceList, SourceMarks } from "@/components/library/source-marks";
import { StripCost } from "@/components/library/strip-cost";
import { Section } from "@/components/ui/section";
import { dayWords } from "@/lib/cases/moment-words";
import { strikeThenPlate } from "@/lib/costs/case-stack";
import { EMPTY_STRIP, queryOf } from "@/lib/costs/strip-address";
import { decimalText } from "@/lib/decimal";
import { TYPICAL_AREA_DM2, TYPICAL_PLATES, type TypicalStripRow } from "@/lib/library/typical-strip";
import { routes } from "@/lib/routes";
import type { LoadedClass } from "./load-class";

interface TypicalCostProps {
  loaded: LoadedClass;
  /** Cents as the shop writes money. */
  money: (cents: number) => string;
  timeZone: string;
  /** May this person work out a batch of their own? */
  canEstimate: boolean;
}

/** A row of the typical costs as the estimator's address: the same deposit on the first of its base metals. */
function stripHref({ plate, baseMetals }: TypicalStripRow): string {
  const layers = TYPICAL_PLATES.find((each) => each.words === plate)?.layers ?? [];
  const typed = strikeThenPlate(layers).map(({ metal, thicknessUm }) => ({
    metal,
    thickness: decimalText(thicknessUm),
    to: "",
  }));
  return routes.strip(
    queryOf({ ...EMPTY_STRIP, area: decimalText(TYPICAL_AREA_DM2), base: baseMetals[0] ?? "", layers: typed }),
  );
}

/** What taking it off means, and what that typically costs: reckoned with the shop's rates, never typed. */
export function TypicalCost({ loaded, money, timeZone, canEstimate }: TypicalCostProps) {
  const { entry, strip, rates, sources } = loaded;
  return (
    <Section title="Typical cost to strip, per part" id="cost">
      <p className="prose">{entry.stripNote}</p>
      {strip && (
        <>
          <StripCost strip={strip} money={money} hrefFor={canEstimate ? stripHref : undefined} />
          <p className="rests">
            Estimate for 1 part of {TYPICAL_AREA_DM2} dm², whole line again; the box holds 90%, the mark is the mean.
            Part value and scrap risk are left out. Thicknesses are usual ones, from memory. Rates since{" "}
            {dayWords(rates.validFromAt, timeZone)}: {rates.source}.
            {strip.unpriced.length > 0 && ` No price is set for ${strip.unpriced.join(", ")}: its plates are left out.`}
          </p>
        </>
      )}
      <SourceMarks keys={entry.sourceKeys} sources={sources} />
    </Section>
  );
}

/** Where all of it comes from, and which revision this is. */
export function Sources({ loaded: { entry, sources, strip } }: { loaded: LoadedClass }) {
  return (
    <Section title="Sources" id="sources" aside={`Revision ${entry.revision} of this page`}>
      <SourceList sources={sources} />
      {strip && (
        <div className="strip-cost__behind">
          <h3>Behind the cost to strip</h3>
          <ul className="lib-list">
            {strip.sources.map((source) => (
              <li key={source}>{`${source.charAt(0).toUpperCase()}${source.slice(1)}`}</li>
            ))}
          </ul>
        </div>
      )}
    </Section>
  );
}
