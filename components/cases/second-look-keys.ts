"use client";

import { useEffect } from "react";
import type { RefObject } from "react";

const HAS_ITS_OWN_ENTER = "a, button, summary, input, select, textarea, [contenteditable], dialog";

/** Enter sends the form from anywhere that has no Enter of its own; with Ctrl or Cmd also out of a field. */
export function useEnterToSend(form: RefObject<HTMLFormElement | null>): void {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (event.key !== "Enter" || event.defaultPrevented || event.repeat || event.altKey) return;
      const isForced = event.ctrlKey || event.metaKey;
      const target = event.target;
      if (!isForced && target instanceof Element && target.closest(HAS_ITS_OWN_ENTER)) return;
      event.preventDefault();
      form.current?.requestSubmit();
    };
    document.addEventListener("keydown", press);
    return () => document.removeEventListener("keydown", press);
  }, [form]);
}
