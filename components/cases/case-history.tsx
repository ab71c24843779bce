import { Fragment } from "react";

export interface HistoryView {
  round: number;
  entries: {
    key: string;
    /** On the shop's clock: "22 Jun 08:14". */
    time: string;
    /** For machines: ISO 8601. */
    iso: string;
    title: string;
    who: string;
    lines: string[];
    tone: "plain" | "good" | "bad";
  }[];
}

/** Everything that happened to a case, on a wire, oldest first. */
export function CaseHistory({ rounds }: { rounds: readonly HistoryView[] }) {
  return (
    <ol className="history">
      {rounds.map(({ round, entries }) => (
        <Fragment key={round}>
          {rounds.length > 1 && <li className="history__round">Round {round}</li>}
          {entries.map((entry) => (
            <li key={entry.key}>
              <time dateTime={entry.iso}>{entry.time}</time>
              <b className={entry.tone === "plain" ? undefined : entry.tone}>{entry.title}</b>
              {entry.who.startsWith(",") ? entry.who : ` ${entry.who}`}
              {entry.lines.map((line, index) => (
                <span key={index} className="history__line">
                  {line}
                </span>
              ))}
            </li>
          ))}
        </Fragment>
      ))}
    </ol>
  );
}
