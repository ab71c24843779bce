import { casesWords, sentenceParts, type CappedCount } from "@/lib/cases/casebook-words";
import type { ResolvedFilter } from "@/lib/cases/casebook-filter";
import type { FilterName } from "@/lib/cases/casebook.schema";

/** Where a filter's field stands, so that its words in the sentence lead there. */
export const filterFieldId = (name: FilterName) => `filter-${name}`;

interface CasebookSentenceProps {
  count: CappedCount;
  names: ResolvedFilter["names"];
  /** Small line under it. */
  below?: string;
}

/** The page's opening sentence is its filters: the words in it lead to their fields. */
export function CasebookSentence({ count, names, below }: CasebookSentenceProps) {
  return (
    <header>
      <h1 className="says">
        <span className="says__count">{casesWords(count)}</span>
        {sentenceParts(names).map((part, index) =>
          "plain" in part ? (
            <span key={index}>{part.plain}</span>
          ) : (
            <a key={index} className={part.isSet ? "word" : "word word--any"} href={`#${filterFieldId(part.filter)}`}>
              {part.words}
            </a>
          ),
        )}
      </h1>
      {below && <p className="says__below">{below}</p>}
    </header>
  );
}
