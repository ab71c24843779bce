import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import type { ConfusionTable } from "@/lib/practice/progress";

export interface ConfusionMatrixProps extends ConfusionTable {
  /** Titles of the classes, in their order. */
  titles: readonly string[];
}

interface MixUp {
  was: number;
  called: number;
  times: number;
}

/** Every cell off the diagonal that holds something, the commonest first. */
function mixUpsOf({ table }: ConfusionTable): MixUp[] {
  return table
    .flatMap((row, was) => row.map((times, called) => ({ was, called, times })))
    .filter((cell) => cell.times > 0 && cell.was !== cell.called)
    .toSorted((a, b) => b.times - a.times);
}

/** Their calls against what was confirmed: as sentences on a phone, as a table on a tablet, as both where there is room. */
export function ConfusionMatrix(props: ConfusionMatrixProps) {
  return (
    <div className="confusion">
      <Matrix {...props} />
      <MixUps {...props} />
    </div>
  );
}

function MixUps({ titles, classes, ...table }: ConfusionMatrixProps) {
  const mixUps = mixUpsOf({ classes, ...table });
  if (mixUps.length === 0) return <p className="mix-ups prose">No class was called another one.</p>;
  return (
    <ul className="mix-ups">
      {mixUps.map(({ was, called, times }) => (
        <li key={`${was} ${called}`}>
          <Glyph name={classGlyph(classes[was] ?? null)} size={26} />
          <span>
            Was <b>{titles[was]?.toLowerCase()}</b>, called <b>{titles[called]?.toLowerCase()}</b>
          </span>
          <span className="fig">{times}×</span>
        </li>
      ))}
    </ul>
  );
}

function Matrix({ classes, titles, table, cantTell }: ConfusionMatrixProps) {
  const hasCantTell = cantTell.some((count) => count > 0);
  return (
    <table className="matrix">
      <caption>Down: what was confirmed. Across: what was called.</caption>
      <thead>
        <tr>
          <td />
          {classes.map((slug, index) => (
            <th scope="col" key={slug}>
              <span>
                {titles[index]}
                <Glyph name={classGlyph(slug)} size={24} />
              </span>
            </th>
          ))}
          {hasCantTell && (
            <th scope="col">
              <span>
                Can&apos;t tell
                <Glyph name={classGlyph(null)} size={24} />
              </span>
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {classes.map((slug, was) => (
          <tr key={slug}>
            <th scope="row">{titles[was]}</th>
            {classes.map((other, called) => (
              <Cell key={other} times={table[was]?.[called] ?? 0} isRight={was === called} />
            ))}
            {hasCantTell && <Cell times={cantTell[was] ?? 0} isRight={false} />}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Cell({ times, isRight }: { times: number; isRight: boolean }) {
  const name = [times === 0 ? "is-none" : isRight ? "is-right" : "is-mixed"].join(" ");
  return (
    <td className={name}>
      {times === 0 ? <span aria-label="none">·</span> : times}
      {times > 0 && <span className="sr-only">{isRight ? " right" : " mixed up"}</span>}
    </td>
  );
}
