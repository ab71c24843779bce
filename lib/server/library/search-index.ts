import { indexLibraryTexts } from "@/db/library-full-text";
import type { Handle } from "@/db/open";
import { getLibraryMark, listSearchEntries } from "@/db/queries/library";
import { buildLargeLibrarySearch } from "@/lib/library/large-library-search";
import type { LibrarySearch } from "@/lib/library/library-hit";
import { buildLibrarySearch } from "@/lib/library/library-search";
import { isLargeLibrary, sizeOf } from "@/lib/library/library-size";
import type { LibraryEntries } from "@/lib/library/search-documents";

interface BuiltSearch {
  mark: string;
  entries: number;
  search: LibrarySearch;
}

/** Built searches kept at once, and entries in them: an entry takes some six kilobytes. */
const MOST_KEPT = 32;
const MOST_KEPT_ENTRIES = 20_000;

const builtByShop = new Map<number, BuiltSearch>();

/** The search over a shop's library, built once and again after something was published in it. */
export function librarySearchFor(db: Handle, shopId: number): LibrarySearch {
  const mark = getLibraryMark(db, shopId);
  const kept = builtByShop.get(shopId);
  if (kept?.mark === mark) return kept.search;
  const entries = listSearchEntries(db, shopId);
  const built = { mark, entries: sizeOf(entries), search: buildBySize(entries) };
  builtByShop.delete(shopId);
  builtByShop.set(shopId, built);
  dropOldest(shopId);
  return built.search;
}

/** Above some hundreds of entries full text chooses those that are weighed. */
export function buildBySize(entries: LibraryEntries): LibrarySearch {
  return isLargeLibrary(sizeOf(entries))
    ? buildLargeLibrarySearch(entries, indexLibraryTexts)
    : buildLibrarySearch(entries);
}

function dropOldest(asked: number): void {
  const total = () => [...builtByShop.values()].reduce((sum, { entries }) => sum + entries, 0);
  for (const shopId of [...builtByShop.keys()]) {
    if (builtByShop.size <= MOST_KEPT && total() <= MOST_KEPT_ENTRIES) return;
    if (shopId !== asked) builtByShop.delete(shopId);
  }
}
