import { useCallback, useEffect, useState } from "react";
import type { LibrarySearch } from "@/lib/library/library-search";
import type { LibraryEntries } from "@/lib/library/search-documents";
import { routes } from "@/lib/routes";

/**
 * The search, once it is wanted: `load` brings the code and the entries, so that a page nobody searches on pays for neither.
 * It stays null where they cannot be had; the form then asks the server.
 */
export function useLibrarySearch(): { search: LibrarySearch | null; load: () => void } {
  const [wanted, setWanted] = useState(false);
  // In an object, because a state setter would call a bare function.
  const [built, setBuilt] = useState<{ search: LibrarySearch } | null>(null);
  useEffect(() => {
    if (!wanted) return;
    const gone = new AbortController();
    void buildSearch(gone.signal).then((search) => {
      if (!search) setWanted(false);
      else if (!gone.signal.aborted) setBuilt({ search });
    });
    return () => gone.abort();
  }, [wanted]);
  const load = useCallback(() => setWanted(true), []);
  return { search: built?.search ?? null, load };
}

async function buildSearch(signal: AbortSignal): Promise<LibrarySearch | null> {
  try {
    const [{ buildLibrarySearch }, answer] = await Promise.all([
      import("@/lib/library/library-search"),
      fetch(routes.libraryEntries(), { signal }),
    ]);
    if (!answer.ok) return null;
    const entries: LibraryEntries = await answer.json();
    return buildLibrarySearch(entries);
  } catch {
    // No signal, or the page is gone: the next focus tries again.
    return null;
  }
}
