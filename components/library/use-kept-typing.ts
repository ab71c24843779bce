import { useEffect, useState } from "react";
import type { FormValues } from "@/lib/library/entry-form";
import { sameValue } from "@/lib/library/same-value";

export interface KeptTyping {
  values: FormValues;
  /** The published revision that the words began from: putting them back must not hide what was published since. */
  baseRevision: number;
  /** It was sent: only a fault makes it worth offering again. */
  sent: boolean;
}

/**
 * Keeps what is typed in this tab until it is saved, so that leaving the page loses none of it.
 * @param place one name for each form
 * @param begun what the form holds at first: typing that says the same is not offered
 */
export function useKeptTyping(place: string, begun: FormValues) {
  const key = `library-typing/${place}`;
  const [offer, setOffer] = useState<KeptTyping | null>(null);
  useEffect(() => {
    const kept = read(key);
    if (!kept) return;
    if (kept.sent || sameValue(kept.values, begun)) forget(key);
    // The tab's own store cannot be read while the page is drawn on the server.
    else setOffer(kept);
  }, [key, begun]);
  return {
    /** What was typed here before and never saved; null for nothing. */
    offer,
    keep: (kept: KeptTyping) => write(key, kept),
    drop: () => {
      forget(key);
      setOffer(null);
    },
    /** The offer was taken: its words are in the form now. */
    taken: () => setOffer(null),
  };
}

function read(key: string): KeptTyping | null {
  try {
    const text = sessionStorage.getItem(key);
    return text ? (JSON.parse(text) as KeptTyping) : null;
  } catch {
    return null;
  }
}

function write(key: string, kept: KeptTyping): void {
  try {
    sessionStorage.setItem(key, JSON.stringify(kept));
  } catch {
    // A full or closed store: the form itself still holds what was typed.
  }
}

function forget(key: string): void {
  try {
    sessionStorage.removeItem(key);
  } catch {
    // Nothing was kept.
  }
}
