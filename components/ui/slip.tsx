import type { ReactNode } from "react";

export interface SlipRow {
  label: ReactNode;
  value: ReactNode;
  /** Colours the value: out of its window, over a limit, sound. Say it in words too. */
  tone?: "warn" | "bad" | "good";
}

/** Label left, value right in the figure face, a hairline under each. */
export function Slip({ rows }: { rows: readonly SlipRow[] }) {
  return (
    <dl className="slip">
      {rows.map((row, index) => (
        <div key={index}>
          <dt>{row.label}</dt>
          <dd className={row.tone}>{row.value}</dd>
        </div>
      ))}
    </dl>
  );
}
