import type { FieldChange } from "@/lib/library/compare-entry";
import type { DiffPart } from "@/lib/library/word-diff";

/** Two texts in one: what went is struck through, what came is underlined. */
export function WordDiffView({ parts }: { parts: readonly DiffPart[] }) {
  return (
    <p className="word-diff">
      {parts.map((part, index) =>
        part.standing === "added" ? (
          <ins key={index}>
            <span className="sr-only"> added: </span>
            {part.text}
          </ins>
        ) : part.standing === "removed" ? (
          <del key={index}>
            <span className="sr-only"> taken out: </span>
            {part.text}
          </del>
        ) : (
          <span key={index}>{part.text}</span>
        ),
      )}
    </p>
  );
}

/** The fields in which two revisions differ. */
export function FieldChanges({ changes, none }: { changes: readonly FieldChange[]; none: string }) {
  if (changes.length === 0) return <p className="mid">{none}</p>;
  return (
    <dl className="field-changes">
      {changes.map((change) => (
        <div key={change.name}>
          <dt>{change.label}</dt>
          <dd>
            <WordDiffView parts={change.parts} />
          </dd>
        </div>
      ))}
    </dl>
  );
}
