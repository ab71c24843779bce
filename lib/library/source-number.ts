import type { LibrarySource, SourceKind } from "./library-entry";

/** A source as a page cites it: published ones by number, the rest by what they are. */
export interface CitedSource {
  key: string;
  kind: SourceKind;
  citation: string;
  /** Beside a fact: "3", "common practice", "from memory". */
  mark: string;
}

const KIND_MARKS: Record<Exclude<SourceKind, "published">, string> = {
  "common-practice": "common practice",
  "from-memory": "from memory",
};

/**
 * The sources that a page uses, in the order in which they are first used; published ones are numbered from 1, and what is
 * no document stands last. A key without a source is left out.
 */
export function citeSources(usedKeys: readonly string[], sources: readonly LibrarySource[]): CitedSource[] {
  const byKey = new Map(sources.map((source) => [source.key, source]));
  const used = [...new Set(usedKeys)].flatMap((key) => byKey.get(key) ?? []);
  const published = used.filter((source) => source.kind === "published");
  const rest = used.flatMap((source) =>
    source.kind === "published" ? [] : [{ ...source, mark: KIND_MARKS[source.kind] }],
  );
  return [...published.map((source, index) => ({ ...source, mark: String(index + 1) })), ...rest];
}
