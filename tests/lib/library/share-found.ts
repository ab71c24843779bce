import type { LibraryHit, LibrarySearch } from "@/lib/library/library-hit";
import type { SearchPhrase } from "./search-phrases";

/** Whether the first three hits hold the class, or the cause or fix itself. */
export function isFound({ finds }: SearchPhrase, hits: readonly LibraryHit[]): boolean {
  return hits.slice(0, 3).some((hit) => {
    if ("class" in finds) return hit.classes.includes(finds.class);
    return (
      hit.slug === ("cause" in finds ? finds.cause : finds.fix) && hit.kind === ("cause" in finds ? "cause" : "fix")
    );
  });
}

/** Share found within the first three, printed by name: an average hides the half that fails. */
export function shareFound(name: string, phrases: readonly SearchPhrase[], search: LibrarySearch): number {
  const found = phrases.filter((phrase) => isFound(phrase, search(phrase.typed))).length;
  console.info(`search, ${name}: ${found} of ${phrases.length} (${((100 * found) / phrases.length).toFixed(1)} %)`);
  return found / phrases.length;
}
