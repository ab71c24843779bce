import type { RateChange } from "@/lib/costs/rate-fields";

/** A dated row of rates on the line of time. */
export interface RatesMark {
  id: string;
  /** "1 Jul 2026". */
  from: string;
  standing: "before" | "now" | "ahead" | "draft";
  /** What changed, in a few words. */
  words: string;
}

const STANDING_WORDS: Record<RatesMark["standing"], string> = {
  before: "",
  now: ", hold now",
  ahead: ", start then",
  draft: ", not saved",
};

/** Rows of rates from left to right, today between them, and dashed what is not saved yet. In order of their days. */
export function RatesTimeline({ marks, today }: { marks: readonly RatesMark[]; today: string }) {
  return (
    <ol className="rates-time" aria-label="Rates by date">
      {marks.map((mark) => [
        <li key={mark.id} className={`rates-time__mark rates-time__mark--${mark.standing}`}>
          <b>
            {mark.from}
            {STANDING_WORDS[mark.standing]}
          </b>
          <span>{mark.words}</span>
        </li>,
        mark.standing === "now" && (
          <li key="today" className="rates-time__today">
            <span>today, {today}</span>
          </li>
        ),
      ])}
    </ol>
  );
}

/** "Labour $49.00 / h to $52.00 / h, and 2 more". */
export function markWords(changes: readonly RateChange[] | null): string {
  if (changes === null) return "The first rates";
  const [first, ...others] = changes;
  if (!first) return "Same figures";
  const words = `${first.label} ${first.from} to ${first.to}`;
  return others.length === 0 ? words : `${words}, and ${others.length} more`;
}
