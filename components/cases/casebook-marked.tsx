import { MarkedParts } from "@/components/ui/marked-parts";
import { matchedParts } from "@/lib/cases/matched-words";
import type { SearchTerm } from "@/lib/cases/search-query";

/** A text with the words that a search found in it marked. */
export function Marked({ text, terms }: { text: string; terms: readonly SearchTerm[] }) {
  if (terms.length === 0) return text;
  return <MarkedParts parts={matchedParts(text, terms)} />;
}
