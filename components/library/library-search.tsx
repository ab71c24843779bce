"use client";

import { useDeferredValue, useEffect, useMemo, useRef, useState } from "react";
import type { KeyboardEvent, SubmitEvent } from "react";
import { SearchHits, type ClassTitles } from "@/components/library/search-hits";
import { useLibrarySearch } from "@/components/library/use-library-search";
import { isChosen } from "@/components/shell/browser-cookie";
import { KEYS_COOKIE } from "@/components/shell/hot-keys";
import { Glyph } from "@/components/ui/glyph";
import { KeyCap } from "@/components/ui/key-cap";
import { counted } from "@/lib/cases/part-words";
import { LIMITS } from "@/lib/cases/case-words";
import type { LibraryHit } from "@/lib/library/library-search";
import { routes } from "@/lib/routes";

export interface LibrarySearchFieldProps {
  /** What the address asks for, and what the server answered to it: the same without script. */
  query: string;
  hits: readonly LibraryHit[];
  /** Kept in the address when the form is sent. */
  station: string | null;
  classTitles: ClassTitles;
}

/**
 * The library's search. It answers at each key once the entries are in the browser; until then, and without script, the
 * form asks the server. Arrows move through the hits, Enter opens one, Escape clears, "/" comes back to the field.
 */
export function LibrarySearchField({ query, hits, station, classTitles }: LibrarySearchFieldProps) {
  const field = useRef<HTMLInputElement>(null);
  const box = useRef<HTMLDivElement>(null);
  const [typed, setTyped] = useState(query);
  const { search, load } = useLibrarySearch();
  useSlashFocuses(field);
  useEffect(() => {
    // Coming back to the page, the address holds what was typed last; the page may be an older one.
    const kept = new URLSearchParams(window.location.search).get("q") ?? "";
    if (kept === query) return;
    setTyped(kept);
    load();
  }, [query, load]);

  // The field shows each letter first; the hits follow, and on a slow phone may skip one.
  const asked = useDeferredValue(typed).trim();
  const found = useMemo(() => (search ? search(asked) : asked === query ? hits : null), [search, asked, query, hits]);
  const keepInAddress = (words: string) => {
    const next = { ...(words ? { q: words } : {}), ...(station ? { station } : {}) };
    window.history.replaceState(null, "", routes.library(next));
  };
  const clear = () => {
    setTyped("");
    keepInAddress("");
    field.current?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const links = [...(box.current?.querySelectorAll<HTMLAnchorElement>(".hits a") ?? [])];
    const at = links.findIndex((link) => link === document.activeElement);
    if (event.key === "Escape") clear();
    if (event.key !== "ArrowDown" && event.key !== "ArrowUp") return;
    event.preventDefault();
    const next = at + (event.key === "ArrowDown" ? 1 : -1);
    if (next < 0) field.current?.focus();
    else links[Math.min(next, links.length - 1)]?.focus();
  };
  const onSubmit = (event: SubmitEvent<HTMLFormElement>) => {
    // Without the entries here, the form goes to the server as it would without script.
    if (!search) return;
    event.preventDefault();
    keepInAddress(asked);
    box.current?.querySelector<HTMLAnchorElement>(".hits a")?.focus();
  };

  return (
    // The box takes no focus itself; it hears the keys of the field and the links inside it.
    // eslint-disable-next-line jsx-a11y/no-static-element-interactions
    <div className="lib-search" ref={box} onKeyDown={onKeyDown}>
      <form action={routes.library()} role="search" onSubmit={onSubmit}>
        {station && <input type="hidden" name="station" value={station} />}
        <label className="field__label" htmlFor="library-q">
          Say it as you see it
        </label>
        <span className="seek">
          <Glyph name="ui-find" />
          <input
            id="library-q"
            ref={field}
            type="search"
            name="q"
            value={typed}
            maxLength={LIMITS.nameChars}
            placeholder="smoky edges, won’t take, C360"
            autoComplete="off"
            autoCapitalize="none"
            spellCheck={false}
            enterKeyHint="search"
            aria-keyshortcuts="/"
            onFocus={load}
            onChange={(event) => setTyped(event.target.value)}
          />
          <KeyCap>/</KeyCap>
        </span>
      </form>
      <p className="sr-only" role="status">
        {asked && found ? counted(found.length, "hit") : ""}
      </p>
      {asked && found && <SearchHits query={asked} hits={found} classTitles={classTitles} />}
      {asked && !found && <p className="rests">Enter asks the library.</p>}
    </div>
  );
}

/** "/" comes to the field, ahead of the band's own. */
function useSlashFocuses(field: { readonly current: HTMLInputElement | null }) {
  useEffect(() => {
    const press = (event: globalThis.KeyboardEvent) => {
      const isTyping = event.target instanceof Element && event.target.closest("input, textarea, select");
      if (event.key !== "/" || isTyping || event.ctrlKey || event.metaKey || event.altKey) return;
      if (isChosen(KEYS_COOKIE, "off") || document.querySelector("dialog:modal")) return;
      event.preventDefault();
      field.current?.focus();
      field.current?.select();
    };
    document.addEventListener("keydown", press, { capture: true });
    return () => document.removeEventListener("keydown", press, { capture: true });
  }, [field]);
}
