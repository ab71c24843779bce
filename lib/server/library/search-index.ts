import type { Handle } from "@/db/open";
import { getLibraryMark, listSearchEntries } from "@/db/queries/library";
import { buildLibrarySearch, type LibrarySearch } from "@/lib/library/library-search";

interface BuiltSearch {
  mark: string;
  search: LibrarySearch;
}

/** Built searches kept at once. Building one takes tens of milliseconds, keeping one about a megabyte. */
const MOST_KEPT = 32;

const builtByShop = new Map<number, BuiltSearch>();

/** The search over a shop's library, built once and again after something was published in it. */
export function librarySearchFor(db: Handle, shopId: number): LibrarySearch {
  const mark = getLibraryMark(db, shopId);
  const kept = builtByShop.get(shopId);
  if (kept?.mark === mark) return kept.search;
  const search = buildLibrarySearch(listSearchEntries(db, shopId));
  builtByShop.delete(shopId);
  builtByShop.set(shopId, { mark, search });
  const oldest = builtByShop.keys().next().value;
  if (builtByShop.size > MOST_KEPT && oldest !== undefined) builtByShop.delete(oldest);
  return search;
}
