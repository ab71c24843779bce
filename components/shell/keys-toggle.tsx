"use client";

import { useSyncExternalStore } from "react";
import { isChosen, rememberChoice } from "@/components/shell/browser-cookie";
import { KEYS_CHANGED, KEYS_COOKIE } from "@/components/shell/hot-keys";

function subscribe(changed: () => void): () => void {
  window.addEventListener(KEYS_CHANGED, changed);
  return () => window.removeEventListener(KEYS_CHANGED, changed);
}

/** Single-key shortcuts can be turned off: speech input and unsteady hands press them by accident (WCAG 2.1.4). */
export function KeysToggle() {
  const off = useSyncExternalStore(
    subscribe,
    () => isChosen(KEYS_COOKIE, "off"),
    () => false,
  );
  const toggle = () => {
    rememberChoice(KEYS_COOKIE, off ? "on" : "off");
    window.dispatchEvent(new Event(KEYS_CHANGED));
  };
  return (
    <button
      type="button"
      className="me-menu__row me-menu__row--keys"
      role="switch"
      aria-checked={!off}
      onClick={toggle}
    >
      Single-key shortcuts
      <span className="switch" aria-hidden="true" />
    </button>
  );
}
