import type { CitedSource } from "@/lib/library/source-number";

/** The id of a source at the foot of the page. */
const sourceId = (key: string) => `source-${key}`;

/** Beside a fact: where it comes from. Each mark leads to the source at the foot. */
export function SourceMarks({ keys, sources }: { keys: readonly string[]; sources: readonly CitedSource[] }) {
  const cited = sources.filter((source) => keys.includes(source.key));
  if (cited.length === 0) return null;
  return (
    <p className="marks">
      <span>{cited.length === 1 ? "Source" : "Sources"}</span>
      {cited.map((source) => (
        <a key={source.key} href={`#${sourceId(source.key)}`} className={markClass(source)}>
          {source.mark}
        </a>
      ))}
    </p>
  );
}

/** Every source of the page, numbered as its marks are. */
export function SourceList({ sources }: { sources: readonly CitedSource[] }) {
  return (
    <ol className="sources">
      {sources.map((source) => (
        <li key={source.key} id={sourceId(source.key)}>
          <span className={markClass(source)}>{source.kind === "published" ? source.mark : ""}</span>
          <span>{source.citation}</span>
        </li>
      ))}
    </ol>
  );
}

function markClass({ kind }: CitedSource): string {
  return kind === "published" ? "src" : "src src--memory";
}
