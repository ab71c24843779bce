import { keepPreviousData, QueryClient, useQuery } from "@tanstack/react-query";
import { useCallback, useMemo, useState } from "react";
import type { LibraryHit, LibrarySearch } from "@/lib/library/library-hit";
import type { LibraryEntries } from "@/lib/library/search-documents";
import { routes } from "@/lib/routes";

export interface FoundInLibrary {
  /** What answers `asked`, or, while the server is asked, what answered last. Null until there is anything. */
  hits: readonly LibraryHit[] | null;
  /** The words that the hits answer. */
  answered: string;
  /** The browser answers by itself, or has the server answer, so the form need not be sent. */
  isReady: boolean;
  /** Brings the code and the entries, so that a page nobody searches on pays for neither. */
  load: () => void;
}

interface Asking {
  /** What is typed. */
  asked: string;
  /** What the page came with: the words of its address, and what the server answered to them. */
  given: { query: string; hits: readonly LibraryHit[] };
  /** The library is too large for the browser: the server is asked at each key. */
  isLarge: boolean;
}

/** The answer at each key: from the entries in the browser, or for a large library from the server. */
export function useLibrarySearch({ asked, given, isLarge }: Asking): FoundInLibrary {
  const [wanted, setWanted] = useState(false);
  const [client] = useState(() => new QueryClient());
  const isGiven = asked === given.query;
  const entries = useQuery(
    { queryKey: ["library search"], queryFn: buildSearch, enabled: wanted && !isLarge, ...KEPT },
    client,
  );
  const { data: built, isError: isWithout, refetch } = entries;
  const load = useCallback(() => {
    setWanted(true);
    if (isWithout) void refetch();
  }, [isWithout, refetch]);
  const { data: answer, isError } = useQuery(
    {
      queryKey: ["library hits", asked],
      queryFn: ({ signal }) => askServer(asked, signal),
      enabled: wanted && isLarge && asked !== "" && !isGiven,
      placeholderData: keepPreviousData,
      ...KEPT,
    },
    client,
  );
  const here = useMemo(() => (built && !isGiven ? built.search(asked) : null), [built, isGiven, asked]);
  const isReady = built !== undefined || (isLarge && wanted && !isError);
  if (isGiven) return { hits: given.hits, answered: asked, isReady, load };
  if (!isLarge) return { hits: here, answered: asked, isReady, load };
  return { hits: answer?.hits ?? null, answered: answer?.asked ?? asked, isReady, load };
}

/** A page's library stands still while it is open; without signal the next focus or key tries again. */
const KEPT = { staleTime: Infinity, retry: false, structuralSharing: false, networkMode: "always" } as const;

async function buildSearch({ signal }: { signal: AbortSignal }): Promise<{ search: LibrarySearch }> {
  const [{ buildLibrarySearch }, entries] = await Promise.all([
    import("@/lib/library/library-search"),
    getJson<LibraryEntries>(routes.libraryEntries(), signal),
  ]);
  // In an object, so that nothing takes it for something to call.
  return { search: buildLibrarySearch(entries) };
}

async function askServer(asked: string, signal: AbortSignal): Promise<{ asked: string; hits: LibraryHit[] }> {
  const { hits } = await getJson<{ hits: LibraryHit[] }>(routes.libraryHits(asked), signal);
  return { asked, hits };
}

/** @throws Error when the server cannot be reached or refuses */
async function getJson<Body>(href: string, signal: AbortSignal): Promise<Body> {
  const answer = await fetch(href, { signal });
  if (!answer.ok) throw new Error(`The library did not answer: ${answer.status}`);
  return answer.json();
}
