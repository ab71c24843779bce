"use client";

import { useState } from "react";
import { Glyph } from "@/components/ui/glyph";

export interface CountStepperProps {
  name: string;
  /** Names the field for readers: "Parts that look like this". */
  label: string;
  /** Under the figure: "parts look like this". */
  words: string;
  start: number;
  min: number;
  max: number;
  onChange?: (value: number) => void;
  error?: string;
}

/** A figure between a minus and a plus, wide enough for a glove. The figure itself can be typed over. */
export function CountStepper({ name, label, words, start, min, max, onChange, error }: CountStepperProps) {
  const [text, setText] = useState(String(start));
  const value = text.trim() === "" ? NaN : Number(text);
  const become = (next: string) => {
    setText(next);
    onChange?.(next.trim() === "" ? NaN : Number(next));
  };
  const step = (by: number) =>
    become(String(Math.min(max, Math.max(min, (Number.isFinite(value) ? value : min) + by))));
  return (
    <div className="count-block">
      <div className="count">
        <button
          type="button"
          className="btn"
          aria-label={`One fewer: ${label}`}
          disabled={value <= min}
          onClick={() => step(-1)}
        >
          <span className="count__minus" aria-hidden="true" />
        </button>
        <label className="count__figure">
          <span className="sr-only">{label}</span>
          <input
            name={name}
            type="number"
            inputMode="numeric"
            min={min}
            max={max}
            value={text}
            aria-invalid={error ? true : undefined}
            onChange={(event) => become(event.target.value)}
          />
          <span aria-hidden="true">{words}</span>
        </label>
        <button
          type="button"
          className="btn"
          aria-label={`One more: ${label}`}
          disabled={value >= max}
          onClick={() => step(1)}
        >
          <Glyph name="ui-plus" />
        </button>
      </div>
      {error && (
        <p className="field__error">
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </div>
  );
}
