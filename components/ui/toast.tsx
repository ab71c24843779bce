"use client";

import { useEffect, useState } from "react";
import { Glyph } from "@/components/ui/glyph";

export type ToastTone = "green" | "amber" | "rust";

interface Said {
  id: number;
  words: string;
  tone: ToastTone;
}

const SAY = "coppertell:say";
const SHOWN_MS = 7000;
const TONE_GLYPHS = { green: "ui-tick", amber: "ui-caution", rust: "ui-stop" } as const;

/** Says an outcome in passing: `say("Off hold. Case closed.")`. What matters is in the case's history as well. */
export function say(words: string, tone: ToastTone = "green"): void {
  window.dispatchEvent(new CustomEvent(SAY, { detail: { words, tone } }));
}

/** Where outcomes appear; the shell holds the only one. */
export function ToastHost() {
  const [list, setList] = useState<Said[]>([]);

  useEffect(() => {
    let last = 0;
    const timers = new Set<number>();
    const hear = (event: Event) => {
      if (!(event instanceof CustomEvent)) return;
      const { words, tone } = event.detail as Omit<Said, "id">; // only `say` above sends this event
      const id = (last += 1);
      setList((before) => [...before.slice(-2), { id, words, tone }]);
      timers.add(window.setTimeout(() => setList((before) => before.filter((item) => item.id !== id)), SHOWN_MS));
    };
    window.addEventListener(SAY, hear);
    return () => {
      window.removeEventListener(SAY, hear);
      timers.forEach((timer) => window.clearTimeout(timer));
    };
  }, []);

  return (
    <div className="toasts" role="status" aria-live="polite">
      {list.map((item) => (
        <p key={item.id} className={`toast toast--${item.tone}`}>
          <Glyph name={TONE_GLYPHS[item.tone]} />
          {item.words}
        </p>
      ))}
    </div>
  );
}
