import Link from "next/link";
import { Glyph } from "@/components/ui/glyph";

export interface ReworkHopsProps {
  /** Whether each step is ticked, in order. */
  ticked: readonly boolean[];
  /** The step on the screen, from 1; null when it is the outcome. */
  shown: number | null;
  hrefFor: (step: number) => string;
}

/** The steps as discs on the dashed copper hop; pressing one reads it. */
export function ReworkHops({ ticked, shown, hrefFor }: ReworkHopsProps) {
  return (
    <nav aria-label="Steps of the card">
      <ol className="hops">
        {ticked.map((isTicked, index) => {
          const step = index + 1;
          return (
            <li key={step} className={isTicked ? "done" : undefined}>
              <Link
                href={hrefFor(step)}
                scroll={false}
                aria-current={step === shown ? "step" : undefined}
                aria-label={`Step ${step}${isTicked ? ", ticked" : ""}`}
              >
                <span>{isTicked && step !== shown ? <Glyph name="ui-tick" /> : step}</span>
              </Link>
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
