import { WorthScale } from "@/components/costs/worth-scale";
import { Glyph } from "@/components/ui/glyph";
import type { GlyphName } from "@/components/ui/glyph-names";
import { Rests } from "@/components/ui/rests";
import type { InspectAdvice } from "@/lib/costs/inspect";
import { shareWords } from "@/lib/costs/share-words";
import { amountWords, worthWords, type WorthFigures } from "@/lib/costs/worth-words";

export interface WorthCheckProps extends WorthFigures {
  /** How long a plater looks at one part: "30 s each" stands beside the price of a check. */
  checkSeconds: number;
  /** When the parts were struck: "in the last 91 days". */
  periodWords: string;
  /** Where the cost of a miss comes from: "mean of 14 own cases after the final plate", "estimate for these parts". */
  missFrom: string;
  /** Where the check's time comes from, when nobody typed it. */
  checkFrom?: string;
  headingLevel?: 3 | 4;
}

const GLYPHS: Record<InspectAdvice, GlyphName> = {
  "check-all": "ui-tick",
  "check-none": "ui-cross",
  "too-few-runs": "not-enough",
};

/** Is looking at every strike worth it: what to do, why, drawn, and what it rests on. Dumb: figures in, words out. */
export function WorthCheck({ headingLevel = 3, ...props }: WorthCheckProps) {
  const Heading = headingLevel === 3 ? "h3" : "h4";
  if (!(props.missCents > 0)) {
    return (
      <div className="worth">
        <Heading className="worth__answer">No saving to weigh the check against.</Heading>
        <p>A bad part that goes on costs no more than one that is held at the strike, as far as these figures go.</p>
      </div>
    );
  }
  const { answer, headline, why, then } = worthWords(props);
  return (
    <div className={`worth worth--${answer.advice}`}>
      <Heading className="worth__answer">
        <Glyph name={GLYPHS[answer.advice]} size={28} />
        {headline}
      </Heading>
      <p>{why}</p>
      {then && <p>{then}</p>}
      <WorthScale breakEvenRate={answer.breakEvenRate} rate={answer.rate} interval={answer.interval} />
      <Basis {...props} breakEvenRate={answer.breakEvenRate} />
    </div>
  );
}

function Basis(props: Omit<WorthCheckProps, "headingLevel"> & { breakEvenRate: number }) {
  const { checkCents, checkSeconds, checkFrom, currency, missCents, missFrom, breakEvenRate } = props;
  const doubled = breakEvenRate * 2;
  const half = doubled < 1 ? `pays above ${shareWords(doubled)}` : "never pays";
  return (
    <>
      <Rests>
        Bad parts among those looked at {props.periodWords}, with the 95% interval. A check: {`${checkSeconds}\u00a0s`},{" "}
        {amountWords(checkCents, currency)}
        {checkFrom ? ` (${checkFrom})` : ""}. A miss: {amountWords(missCents, currency)} a part, {missFrom}.
      </Rests>
      <details className="worth__how">
        <summary>The rule, and what it takes for granted</summary>
        <p>
          All or none: check every part when the share of bad ones lies above the price of a check over the price of a
          miss, none when below; nothing in between is cheaper. Deming, Out of the Crisis, chapter 15. The interval is
          Wilson’s (1927; Newcombe 1998, method 3).
        </p>
        <p>
          It takes for granted that who looks sees a bad part, and that the parts to come are like these. A check that
          sees only half of them {half}.
        </p>
      </details>
    </>
  );
}
