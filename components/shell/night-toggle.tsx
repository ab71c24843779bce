"use client";

import { useSyncExternalStore } from "react";
import { rememberChoice } from "@/components/shell/browser-cookie";
import { Glyph } from "@/components/ui/glyph";

const DARK = "(prefers-color-scheme: dark)";

function subscribe(changed: () => void): () => void {
  const system = window.matchMedia(DARK);
  const choice = new MutationObserver(changed);
  choice.observe(document.documentElement, { attributes: true, attributeFilter: ["data-theme"] });
  system.addEventListener("change", changed);
  return () => {
    choice.disconnect();
    system.removeEventListener("change", changed);
  };
}

function isNight(): boolean {
  const chosen = document.documentElement.dataset.theme;
  return chosen ? chosen === "night" : window.matchMedia(DARK).matches;
}

/** Night shift on or off; until it is pressed the system decides. */
export function NightToggle() {
  const night = useSyncExternalStore(subscribe, isNight, () => false);
  const toggle = () => {
    const theme = night ? "day" : "night";
    rememberChoice("theme", theme);
    document.documentElement.dataset.theme = theme;
  };
  return (
    <button type="button" className="me-menu__row" role="switch" aria-checked={night} onClick={toggle}>
      <Glyph name="ui-night" />
      Night shift
      <span className="switch" aria-hidden="true" />
    </button>
  );
}
