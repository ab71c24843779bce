import { Range } from "@/components/ui/range";
import type { ReworkEstimate } from "@/lib/costs/estimate-plan";
import { scaleEndCents, type StripReckoning } from "@/lib/costs/reckon-strip";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import { besideWords, massWords, minutesWords, refusalWords, roundMoney } from "@/lib/costs/strip-words";

interface SheetWaysProps {
  reckoning: StripReckoning;
  currency: string;
  withMoney: boolean;
}

/** The ways under each other, as paper has them: name, figure, range drawn, minutes. Without money only whether it is offered. */
export function SheetWays({ reckoning, currency, withMoney }: SheetWaysProps) {
  const { offered, refused, beside, chosen } = reckoning;
  const endCents = scaleEndCents([...offered.map((way) => way.estimate), beside.estimate]);
  const row = (title: string, estimate: ReworkEstimate) => (
    <WayRow key={title} title={title} estimate={estimate} endCents={endCents} currency={currency} />
  );
  return (
    <section>
      <h3>Ways to take it off</h3>
      <ul className="strip-sheet__ways">
        {offered.map(({ method, estimate }) => {
          const title = `${STRIP_METHOD_TITLES[method]}${method === chosen.method ? ", shown here" : ""}`;
          return withMoney ? row(title, estimate) : <li key={method}>{title}</li>;
        })}
        {refused.map((way) => {
          const { headline, reason } = refusalWords(way.why);
          return (
            <li key={way.method} className="strip-sheet__no">
              <b>{STRIP_METHOD_TITLES[way.method]}</b>
              <span>
                {headline} {reason}
              </span>
            </li>
          );
        })}
        {withMoney && row(beside.kind === "at-strike" ? "At the strike" : "If it goes on", beside.estimate)}
      </ul>
      {withMoney && <p className="strip-sheet__why">{besideWords(reckoning)}</p>}
    </section>
  );
}

interface WayRowProps {
  title: string;
  estimate: ReworkEstimate;
  endCents: number;
  currency: string;
}

function WayRow({ title, estimate, endCents, currency }: WayRowProps) {
  const { meanCents, low90Cents, high90Cents, minutes, metalWrittenOffG } = estimate;
  const money = (cents: number) => roundMoney(cents, currency);
  const words = { low: money(low90Cents), likely: money(meanCents), high: money(high90Cents) };
  return (
    <li>
      <b>{title}</b>
      <b className="fig">{words.likely}</b>
      <Range estimate low={low90Cents} likely={meanCents} high={high90Cents} max={endCents} words={words} />
      <span>
        {words.low} to {words.high}, {minutesWords(minutes.mean)} hands-on, {massWords(metalWrittenOffG)} written off
      </span>
    </li>
  );
}
