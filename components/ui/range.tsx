import type { CSSProperties } from "react";

export interface RangeProps {
  low: number;
  likely: number;
  high: number;
  /** Ends of the scale; 0 and `high` without them. */
  min?: number;
  max?: number;
  /** The three figures in words, money with its sign. */
  words: { low: string; likely: string; high: string };
  /** Box with dashed rules inside for an estimate, solid for what was recorded. */
  estimate?: boolean;
  /** A second figure on the same scale, as a copper dot: what it costs now. */
  mark?: { at: number; words: string };
}

type RangePlace = CSSProperties & Record<"--a" | "--m" | "--b", number>;

/** Low to high as a box, the likely figure as a heavy mark. */
export function Range({ low, likely, high, min = 0, max = high, words, estimate = false, mark }: RangeProps) {
  const share = (figure: number) => (max > min ? Math.min(100, Math.max(0, ((figure - min) / (max - min)) * 100)) : 0);
  const place: RangePlace = { "--a": share(low), "--m": share(likely), "--b": share(high) };
  const kind = estimate ? "Estimate" : "Recorded";
  const said = `${kind}: likely ${words.likely}, ${words.low} to ${words.high}${mark ? `; ${mark.words}` : ""}`;
  return (
    <div className="range-block">
      <span className={estimate ? "range range--estimate" : "range"} role="img" aria-label={said} style={place}>
        <i />
        <b />
        {mark && <u style={{ left: `${share(mark.at)}%` }} />}
      </span>
      <span className="range__words" aria-hidden="true">
        <span>{mark ? mark.words : `likely ${words.likely}`}</span>
        <span>
          {words.low} to {words.high}
        </span>
      </span>
    </div>
  );
}
