"use client";

import { useDeferredValue, useEffect, useRef, useState } from "react";
import type { KeyboardEvent, SubmitEvent } from "react";
import { SearchHits, type ClassTitles } from "@/components/library/search-hits";
import { useLibrarySearch } from "@/components/library/use-library-search";
import { isChosen } from "@/components/shell/browser-cookie";
import { KEYS_COOKIE } from "@/components/shell/hot-keys";
import { Glyph } from "@/components/ui/glyph";
import { KeyCap } from "@/components/ui/key-cap";
import { counted } from "@/lib/cases/part-words";
import { LIMITS } from "@/lib/cases/case-words";
import type { LibraryHit } from "@/lib/library/library-hit";
import { routes } from "@/lib/routes";

export interface LibrarySearchFieldProps {
  /** What the address asks for, and what the server answered to it: the same without script. */
  query: string;
  hits: readonly LibraryHit[];
  /** Too large for the browser to search by itself. */
  isLarge: boolean;
  /** Kept in the address when the form is sent. */
  station: string | null;
  classTitles: ClassTitles;
}

/**
 * The library's search. It answers at each key once the entries are in the browser, a large library from the server; until
 * then, and without script, the form is sent. Arrows move through the hits, Enter opens one, a letter goes on in the field,
 * Escape clears, "/" comes back to the field.
 */
export function LibrarySearchField({ query, hits, isLarge, station, classTitles }: LibrarySearchFieldProps) {
  const field = useRef<HTMLInputElement>(null);
  const box = useRef<HTMLDivElement>(null);
  const [typed, setTyped] = useState(query);
  // The field shows each letter first; the hits follow, and on a slow phone may skip one.
  const asked = useDeferredValue(typed).trim();
  const found = useLibrarySearch({ asked, given: { query, hits }, isLarge });
  const { load } = found;
  useSlashFocuses(field);
  useEffect(() => {
    // Coming back to the page, the address holds what was typed last; the page may be an older one.
    const kept = new URLSearchParams(window.location.search).get("q") ?? "";
    if (kept === query) return;
    setTyped(kept);
    load();
  }, [query, load]);

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
    if (event.key === "Escape") clear();
    else if (event.key === "ArrowDown" || event.key === "ArrowUp") {
      event.preventDefault();
      moveFocus(box.current, field.current, event.key === "ArrowDown" ? 1 : -1);
    } else if (isLetter(event) && event.target instanceof HTMLAnchorElement) field.current?.focus();
  };
  const onSubmit = (event: SubmitEvent<HTMLFormElement>) => {
    // Until the answers come at each key, the form goes to the server as it would without script.
    if (!found.isReady) return;
    event.preventDefault();
    keepInAddress(asked);
    linksIn(box.current)[0]?.focus();
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
        <p className="field__hint" id="library-q-hint">
          What the copper looks like, the alloy or the tank. Spelling does not matter.
        </p>
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
            aria-describedby="library-q-hint"
            aria-keyshortcuts="/"
            onFocus={load}
            onChange={(event) => setTyped(event.target.value)}
          />
          <KeyCap>/</KeyCap>
        </span>
      </form>
      <p className="sr-only" role="status">
        {asked && found.hits ? announcement(found.hits) : ""}
      </p>
      {asked && found.hits && <SearchHits query={found.answered} hits={found.hits} classTitles={classTitles} />}
      {asked && !found.hits && <p className="rests">{found.isReady ? "Looking." : "Enter asks the library."}</p>}
    </div>
  );
}

/** How many hits there are and the first of them, for who does not see the list change. */
function announcement(hits: readonly LibraryHit[]): string {
  const [first] = hits;
  return first ? `${counted(hits.length, "hit")}, first ${first.title}` : "Nothing found";
}

function linksIn(box: HTMLElement | null): HTMLAnchorElement[] {
  return [...(box?.querySelectorAll<HTMLAnchorElement>(".hits a") ?? [])];
}

/** To the next hit or the one before; before the first stands the field. */
function moveFocus(box: HTMLElement | null, field: HTMLElement | null, by: 1 | -1): void {
  const links = linksIn(box);
  const next = links.findIndex((link) => link === document.activeElement) + by;
  if (next < 0) field?.focus();
  else links[Math.min(next, links.length - 1)]?.focus();
}

function isLetter({ key, ctrlKey, metaKey, altKey }: KeyboardEvent): boolean {
  return key.length === 1 && key !== " " && key !== "/" && !ctrlKey && !metaKey && !altKey;
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
