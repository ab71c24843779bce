"use client";

import { useEffect, useRef } from "react";
import type { KeyboardEvent, ReactNode } from "react";

const STEP: Record<string, number> = { ArrowRight: 1, ArrowLeft: -1 };

/** Which station was pressed last. A press puts a new page in place, strip and all; the focus goes back to where it was. */
let pressedAt: number | null = null;

export interface LineStripNavProps {
  className: string;
  pressed: string | null;
  label: string;
  children: ReactNode;
}

/** Adds the keys to the strip: arrows move, Escape shows the whole line; on a phone it scrolls to the pressed station. */
export function LineStripNav({ className, pressed, label, children }: LineStripNavProps) {
  const nav = useRef<HTMLElement>(null);
  const links = () => [...(nav.current?.querySelectorAll<HTMLAnchorElement>("a") ?? [])];

  useEffect(() => {
    const list = nav.current?.querySelector("ol");
    const cell = list?.querySelector<HTMLElement>("[aria-current]")?.parentElement;
    if (list && cell && list.scrollWidth > list.clientWidth) list.scrollLeft = cell.offsetLeft - 60;
    if (pressedAt !== null) links()[pressedAt]?.focus({ preventScroll: true });
    pressedAt = null;
  }, [pressed]);

  const onKeyDown = (event: KeyboardEvent) => {
    const step = STEP[event.key];
    if (event.key === "Escape") {
      links()
        .find((link) => link.hasAttribute("aria-current"))
        ?.click();
    }
    if (step === undefined) return;
    event.preventDefault();
    const all = links();
    const from = all.findIndex((link) => link === document.activeElement);
    all[(from + step + all.length) % all.length]?.focus();
  };

  return (
    // The nav itself takes no focus; it hears the keys and presses of the links inside it.
    // eslint-disable-next-line jsx-a11y/no-noninteractive-element-interactions
    <nav
      ref={nav}
      className={className}
      aria-label={label}
      onKeyDown={onKeyDown}
      onClick={(event) => {
        pressedAt = links().findIndex((link) => link.contains(event.target as Node)); // a click's target is a node
      }}
    >
      {children}
    </nav>
  );
}
