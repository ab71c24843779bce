import Link from "next/link";
import type { ReactNode } from "react";
import { Caution } from "@/components/ui/caution";
import { Range } from "@/components/ui/range";
import { BASE_METAL_TITLES } from "@/lib/cases/case-words";
import { isStopCaution } from "@/lib/costs/strip-cautions";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import type { StripCost as Cost, TypicalStrip, TypicalStripRow } from "@/lib/library/typical-strip";

export interface StripCostProps {
  strip: TypicalStrip;
  /** Cents as the shop writes money, whole units. */
  money: (cents: number) => string;
  /** Where a row is worked out for a batch; absent for those who may not. */
  hrefFor?: (row: TypicalStripRow) => string;
}

interface CostRowProps {
  label: ReactNode;
  sub: string;
  cost: Cost;
  maxCents: number;
  money: (cents: number) => string;
}

function CostRow({ label, sub, cost, maxCents, money }: CostRowProps) {
  return (
    <div className="strip-cost__row">
      <dt>
        <strong>{label}</strong>
        <span className="small mid">{sub}</span>
      </dt>
      <dd>
        <Range
          estimate
          low={cost.lowCents}
          likely={cost.meanCents}
          high={cost.highCents}
          max={maxCents}
          words={{ low: money(cost.lowCents), likely: money(cost.meanCents), high: money(cost.highCents) }}
        />
      </dd>
    </div>
  );
}

/** "After nickel 10 µm" */
const plateWords = ({ plate }: TypicalStripRow) => `After ${plate.charAt(0).toLowerCase()}${plate.slice(1)}`;

/** "on steel and brass, polish back" */
function rowWords({ baseMetals, method }: TypicalStripRow): string {
  const metals = baseMetals.map((metal) => BASE_METAL_TITLES[metal].toLowerCase());
  const list = metals.length > 1 ? `${metals.slice(0, -1).join(", ")} and ${metals.at(-1)}` : metals.join("");
  return `on ${list}, ${STRIP_METHOD_TITLES[method].toLowerCase()}`;
}

/** What one part typically costs to put right, at the strike and after each usual final plate, on one scale. */
export function StripCost({ strip, money, hrefFor }: StripCostProps) {
  const maxCents = Math.max(strip.atStrike.highCents, ...strip.rows.map((row) => row.highCents));
  const cautions = strip.cautions.toSorted((a, b) => Number(isStopCaution(b)) - Number(isStopCaution(a)));
  return (
    <>
      <dl className="strip-cost">
        <CostRow
          label="At the strike"
          sub={`copper only, ${STRIP_METHOD_TITLES[strip.atStrike.method].toLowerCase()}`}
          cost={strip.atStrike}
          maxCents={maxCents}
          money={money}
        />
        {strip.rows.map((row) => (
          <CostRow
            key={`${row.plate} ${row.baseMetals.join(" ")}`}
            label={
              hrefFor ? (
                <Link className="solo" href={hrefFor(row)}>
                  {plateWords(row)}
                </Link>
              ) : (
                plateWords(row)
              )
            }
            sub={rowWords(row)}
            cost={row}
            maxCents={maxCents}
            money={money}
          />
        ))}
      </dl>
      <div className="strip-cost__cautions">
        {cautions.map((words) => (
          <Caution key={words} level={isStopCaution(words) ? "stop" : "caution"}>
            {words}
          </Caution>
        ))}
      </div>
    </>
  );
}
