import type { SearchTerm } from "@/lib/cases/search-query";

interface CasebookReadingProps {
  terms: readonly SearchTerm[];
  /** No case holds all the words. */
  isLoose: boolean;
}

/** Says how a search was read, where that is not what was typed. */
export function CasebookReading({ terms, isLoose }: CasebookReadingProps) {
  const mended = terms.filter((term) => term.readAs.length > 0);
  if (mended.length === 0 && !isLoose) return null;
  return (
    <p className="cb-reading" role="status">
      {mended.length > 0 && (
        <>
          Read{" "}
          {mended.map(({ typed, readAs }, index) => (
            <span key={typed}>
              {index > 0 && ", "}
              {typed} as <b>{readAs[0]}</b>
            </span>
          ))}
          .{" "}
        </>
      )}
      {isLoose && "No case holds all of these words. These hold some of them."}
    </p>
  );
}
