import type { StripChange } from "@/lib/costs/strip-row-changes";

/** One row of a way as its history shows it. */
export interface StripRowStory {
  id: number;
  /** "3 Aug 2026, 14:02". */
  at: string;
  /** Null for the row that came first. */
  changes: readonly StripChange[] | null;
  /** "retired it", "brought it back". */
  turned: string | null;
  /** "Ruth Okafor", "Came with the shop". */
  setBy: string;
}

/** Every row of a way, the newest first. */
export function StripWayHistory({ rows }: { rows: readonly StripRowStory[] }) {
  return (
    <ol className="rates-rows">
      {rows.map((row, index) => (
        <li key={row.id} className={`rates-rows__row rates-rows__row--${index === 0 ? "now" : "before"}`}>
          <h3>
            {row.at}
            {index === 0 && <small>holds now</small>}
          </h3>
          {row.changes === null && <p className="mid">The first row.</p>}
          {row.turned && <p>{row.turned}</p>}
          {row.changes && row.changes.length > 0 && (
            <ul>
              {row.changes.map((change) => (
                <li key={change.what}>
                  {change.what}: {change.from} <b>to</b> {change.to}
                </li>
              ))}
            </ul>
          )}
          <p className="small quiet">{row.setBy}</p>
        </li>
      ))}
    </ol>
  );
}
