import Link from "next/link";
import { Range } from "@/components/ui/range";
import { Rests } from "@/components/ui/rests";
import { formatMoney } from "@/lib/money";

export interface StakeMoney {
  atRisk: { meanCents: number; low90Cents: number; high90Cents: number };
  /** Putting it right now; null where nothing was worked out yet. */
  rightNow: { meanCents: number; low90Cents: number; high90Cents: number } | null;
}

interface StakeProps {
  money: StakeMoney;
  currency: string;
  quantity: number;
  /** "1 Jun 2026" */
  ratesFrom: string;
  /** What was assumed because nobody said. */
  assumed: readonly string[];
  /** Where the ways to take it off stand side by side; absent for those who may not see it. */
  stripHref?: string;
}

/** What letting it go on is likely to cost, against putting it right now. Only for those who may see money. */
export function Stake({ money, currency, quantity, ratesFrom, assumed, stripHref }: StakeProps) {
  const { atRisk, rightNow } = money;
  const words = (cents: number) => formatMoney(cents, currency, { whole: true });
  return (
    <div className="stake picks-set" role="group" aria-labelledby="stake-head">
      <p className="stake__head" id="stake-head">
        At stake
        <small>
          {quantity === 1 ? "1 part" : `${quantity} parts`}, rates of {ratesFrom}
        </small>
      </p>
      <dl>
        <div>
          <dt>If it goes on, fails later</dt>
          <dd className="fig">{words(atRisk.meanCents)}</dd>
        </div>
        {rightNow && (
          <div className="stake__now">
            <dt>Put right now</dt>
            <dd className="fig">{words(rightNow.meanCents)}</dd>
          </div>
        )}
      </dl>
      <Range
        estimate
        low={atRisk.low90Cents}
        likely={atRisk.meanCents}
        high={atRisk.high90Cents}
        words={{ low: words(atRisk.low90Cents), likely: words(atRisk.meanCents), high: words(atRisk.high90Cents) }}
        mark={
          rightNow
            ? { at: rightNow.meanCents, words: `${words(rightNow.low90Cents)} to ${words(rightNow.high90Cents)}` }
            : undefined
        }
      />
      <Rests>Estimates, 90% ranges.{assumed.length > 0 && ` ${assumed.join(" ")}`}</Rests>
      {stripHref && (
        <Link className="solo" href={stripHref}>
          Work out the strip
        </Link>
      )}
    </div>
  );
}
