/** From how many entries on a library is searched on the server, and how many one has. */
import type { LibraryEntries } from "@/lib/library/search-documents";

/** Up to here a browser brings the entries (some 50 kB packed) and weighs each at every key without the field noticing. */
export const MOST_SEARCHED_IN_BROWSER = 500;

/** Whether a library is searched on the server, through full text. */
export function isLargeLibrary(entries: number): boolean {
  return entries > MOST_SEARCHED_IN_BROWSER;
}

/** Classes, causes and fixes together. */
export function sizeOf({ classes, causes, fixes }: LibraryEntries): number {
  return classes.length + causes.length + fixes.length;
}
