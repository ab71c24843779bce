"use client";

import { useEffect, useRef } from "react";
import type { KeyboardEvent, ReactNode } from "react";

const STEP: Record<string, number> = { ArrowRight: 1, ArrowLeft: -1 };

/** Adds the keys to the strip: arrows move, Escape shows the whole line; on a phone it scrolls to the pressed station. */
export function LineStripNav({
  className,
  pressed,
  label,
  children,
}: {
  className: string;
  pressed: string | null;
  label: string;
  children: ReactNode;
}) {
  const nav = useRef<HTMLElement>(null);

  useEffect(() => {
    const list = nav.current?.querySelector("ol");
    const cell = list?.querySelector<HTMLElement>("[aria-current]")?.parentElement;
    if (list && cell && list.scrollWidth > list.clientWidth) list.scrollLeft = cell.offsetLeft - 60;
  }, [pressed]);

  const onKeyDown = (event: KeyboardEvent) => {
    const links = [...(nav.current?.querySelectorAll<HTMLAnchorElement>("a") ?? [])];
    const step = STEP[event.key];
    if (event.key === "Escape") links.find((link) => link.hasAttribute("aria-current"))?.click();
    if (step === undefined) return;
    event.preventDefault();
    const from = links.findIndex((link) => link === document.activeElement);
    links[(from + step + links.length) % links.length]?.focus();
  };

  return (
    // The nav itself takes no focus; it hears the keys of the links inside it.
    // eslint-disable-next-line jsx-a11y/no-noninteractive-element-interactions
    <nav ref={nav} className={className} aria-label={label} onKeyDown={onKeyDown}>
      {children}
    </nav>
  );
}
