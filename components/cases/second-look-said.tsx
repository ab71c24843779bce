"use client";

import { useEffect } from "react";
import { say } from "@/components/ui/toast";

const KEY = "coppertell:second-look-said";

/** Keeps an outcome for the page that comes next: it is said there, where the person looks by then. */
export function sayOnNextPage(words: string): void {
  sessionStorage.setItem(KEY, words);
}

/** Says what the page before has left to be said. */
export function SaidBefore() {
  useEffect(() => {
    const words = sessionStorage.getItem(KEY);
    if (!words) return;
    // One turn later: the host of these sayings begins to listen after this effect.
    const turn = window.setTimeout(() => {
      sessionStorage.removeItem(KEY);
      say(words);
    }, 0);
    return () => window.clearTimeout(turn);
  }, []);
  return null;
}
