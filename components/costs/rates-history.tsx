import type { RateChange } from "@/lib/costs/rate-fields";

/** One row of rates as the dated list shows it. */
export interface RatesRowStory {
  id: number;
  /** "1 Jul 2026". */
  from: string;
  standing: "ahead" | "now" | "before";
  /** What it changed against the row before; null for the first row of all. */
  changes: readonly RateChange[] | null;
  /** "Ruth Okafor, 30 Jun 2026". */
  setBy: string;
  source: string;
}

const STANDING_WORDS: Record<RatesRowStory["standing"], string> = {
  ahead: "starts then",
  now: "holds now",
  before: "",
};

function Changes({ changes }: Pick<RatesRowStory, "changes">) {
  if (changes === null) return <p className="mid">The shop’s first rates.</p>;
  if (changes.length === 0) return <p className="mid">Same figures, another source.</p>;
  return (
    <ul>
      {changes.map((change) => (
        <li key={change.label}>
          {change.label} <span className="fig">{change.from}</span> to <span className="fig">{change.to}</span>
        </li>
      ))}
    </ul>
  );
}

/** Every row of rates, the latest start first. */
export function RatesHistory({ rows }: { rows: readonly RatesRowStory[] }) {
  return (
    <ol className="rates-rows">
      {rows.map((row) => (
        <li key={row.id} className={`rates-rows__row rates-rows__row--${row.standing}`}>
          <h3>
            {row.from}
            {STANDING_WORDS[row.standing] && <small>{STANDING_WORDS[row.standing]}</small>}
          </h3>
          <Changes changes={row.changes} />
          <p className="small quiet">
            {row.setBy}. Source: {row.source}
          </p>
        </li>
      ))}
    </ol>
  );
}
