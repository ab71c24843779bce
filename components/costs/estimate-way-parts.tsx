import { Caution } from "@/components/ui/caution";
import { Range } from "@/components/ui/range";
import type { ReworkEstimate } from "@/lib/costs/estimate-plan";
import type { StripBatch } from "@/lib/costs/read-strip";
import { isStopCaution } from "@/lib/costs/strip-cautions";
import type { StripStep } from "@/lib/costs/strip-plan";
import { figureWords, linesWords, massWords, metalTitle, minutesWords, roundMoney } from "@/lib/costs/strip-words";

interface WayFigureProps {
  estimate: ReworkEstimate;
  endCents: number;
  currency: string;
}

/** The sum, its 90 % range, the minutes, and the range drawn on the scale that all ways share. */
export function WayFigure({ estimate, endCents, currency }: WayFigureProps) {
  const { meanCents, low90Cents, high90Cents, minutes } = estimate;
  const money = (cents: number) => roundMoney(cents, currency);
  return (
    <>
      <p className="est-way__sum">
        {money(meanCents)}
        <small>
          {money(low90Cents)} to {money(high90Cents)}. {minutesWords(minutes.mean)} hands-on.
        </small>
      </p>
      <div className="est-scale">
        <Range
          estimate
          low={low90Cents}
          likely={meanCents}
          high={high90Cents}
          max={endCents}
          words={{ low: money(low90Cents), likely: money(meanCents), high: money(high90Cents) }}
        />
        <span className="est-scale__ends" aria-hidden="true">
          <span>{money(0)}</span>
          <span>{money(endCents)}</span>
        </span>
      </div>
    </>
  );
}

interface CostLinesProps {
  estimate: ReworkEstimate;
  batch: StripBatch;
  currency: string;
}

/** What the sum is made of; lines of nothing are left out. As they are shown they add up: whole units are shared out. */
export function CostLines({ estimate, batch, currency }: CostLinesProps) {
  const total = batch.quantity === 1 ? "The part" : `All ${batch.quantity.toLocaleString("en-US")} parts`;
  const words = linesWords(
    estimate.lines.map((line) => line.meanCents),
    currency,
  );
  const nothing = linesWords([0], currency).concat(roundMoney(0, currency));
  const lines = estimate.lines.map((line, index) => ({ ...line, words: words[index] ?? "" }));
  return (
    <dl className="est-lines">
      {lines
        .filter((line) => !nothing.includes(line.words))
        .map((line) => (
          <div key={line.key}>
            <dt>
              {line.name}
              {lineAside(line.key, estimate, batch, currency)}
            </dt>
            <dd>{line.words}</dd>
          </div>
        ))}
      <div className="est-lines__total">
        <dt>{total}</dt>
        <dd>{roundMoney(estimate.meanCents, currency)}</dd>
      </div>
    </dl>
  );
}

function lineAside(key: string, estimate: ReworkEstimate, batch: StripBatch, currency: string): string {
  if (key === "labour") return `, ${minutesWords(estimate.minutes.mean)}`;
  if (key === "line") return `, ${minutesWords(estimate.tankMinutes.mean)} in tanks`;
  if (key === "metalWrittenOff") return `, ${massWords(estimate.metalWrittenOffG)}`;
  if (key === "scrapRisk" && batch.partValueCents !== undefined)
    return `, parts worth ${roundMoney(batch.partValueCents * batch.quantity, currency)}`;
  return "";
}

/** Which layer comes off how, from the top one down. */
export function Steps({ steps }: { steps: readonly StripStep[] }) {
  return (
    <>
      <h4 className="est-way__sub">In this order</h4>
      <ol className="est-steps">
        {steps.map((step, index) => (
          <li key={index}>
            <b>{metalTitle(step.layer.metal)}</b> {figureWords(step.layer.thicknessUm)} µm.{" "}
            <span>{stepWords(step)}</span>
          </li>
        ))}
      </ol>
    </>
  );
}

/** "Thiourea in dilute acid, part as anode, 20 to 60 °C, 2 to 6 V." */
export function stepWords(step: StripStep): string {
  if (step.kind === "polish") return "Polish, fine abrasive or soft wheel.";
  const { solution, bathTempC, current } = step.row;
  const [from, to] = bathTempC;
  const temperature = from === to ? `${from} °C` : `${from} to ${to} °C`;
  return `${solution}, ${temperature}${current ? `, ${current}` : ""}.`;
}

/** The cautions of a way, the strong ones with the stop sign. */
export function CautionList({ cautions }: { cautions: readonly string[] }) {
  return (
    <div className="est-cautions">
      {cautions.map((words) => (
        <Caution key={words} level={isStopCaution(words) ? "stop" : "caution"}>
          {words}
        </Caution>
      ))}
    </div>
  );
}
