"use client";

import { useEffect, useRef } from "react";

/**
 * A form that was sent goes away with what follows it, and takes the focus with it. When `on` changes, a reader and
 * the keyboard go on at the page's heading; not when the page is first shown.
 */
export function FocusHeading({ on }: { on: string }) {
  const before = useRef(on);
  useEffect(() => {
    if (before.current === on) return;
    before.current = on;
    const heading = document.querySelector<HTMLElement>("#work h1");
    if (!heading) return;
    heading.tabIndex = -1;
    heading.focus();
  }, [on]);
  return null;
}
