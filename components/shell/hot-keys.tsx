"use client";

import { useEffect } from "react";
import { isChosen } from "@/components/shell/browser-cookie";

export const KEYS_COOKIE = "keys";
export const KEYS_CHANGED = "coppertell:keys";

const TYPED_INTO = "textarea, select, [contenteditable], input:not([type=radio], [type=checkbox])";

function isTyping(target: EventTarget | null): boolean {
  return target instanceof Element && target.closest(TYPED_INTO) !== null;
}

/** Presses whatever on the screen carries the pressed key in `data-key`. Kit buttons, links and picks set it from `keyCap`. */
export function HotKeys() {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      if (event.key.length !== 1 || isChosen(KEYS_COOKIE, "off") || document.querySelector("dialog:modal")) return;
      const all = document.querySelectorAll<HTMLElement>(`[data-key="${CSS.escape(event.key.toLowerCase())}"]`);
      const shown = [...all].find((element) => element.getClientRects().length > 0);
      if (!shown) return;
      event.preventDefault();
      shown.focus();
      shown.click();
    };
    document.addEventListener("keydown", press);
    return () => document.removeEventListener("keydown", press);
  }, []);
  return null;
}
