"use client";

import { useId } from "react";
import type { StripEditing } from "@/components/costs/estimate-editing";
import { Glyph } from "@/components/ui/glyph";
import { metalField, thicknessField, toField, type TypedLayer } from "@/lib/costs/strip-address";
import { changeStack } from "@/lib/costs/strip-typing";
import { massWords, metalTitle } from "@/lib/costs/strip-words";
import type { WeighedLayer } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS } from "@/lib/plating/metals";

interface LayerRowProps extends StripEditing {
  layer: TypedLayer;
  /** From the base metal out, from 1. */
  place: number;
  weighed: WeighedLayer | undefined;
  isToScale: boolean;
}

/** One layer: metal, thickness or a range of it, what it weighs in all, and a way down one place. */
export function LayerRow({ layer, place, weighed, isToScale, ...editing }: LayerRowProps) {
  const { typed, faults, onChange } = editing;
  const errorId = useId();
  const change = (part: Partial<TypedLayer>) =>
    onChange({ ...typed, layers: typed.layers.with(place - 1, { ...layer, ...part }) });
  const error = faults[metalField(place)] ?? faults[thicknessField(place)] ?? faults[toField(place)];
  const wire = (field: string) => ({
    name: field,
    "aria-invalid": faults[field] ? (true as const) : undefined,
    "aria-describedby": faults[field] ? errorId : undefined,
  });
  const unit = typed.thicknessUnit === "mil" ? "mil" : "µm";
  return (
    <li className="est-layer">
      <div className="est-layer__fields">
        <span className="est-layer__metal">
          <select
            className="input"
            aria-label={`Metal of layer ${place}`}
            value={layer.metal}
            onChange={(event) => change({ metal: event.target.value })}
            {...wire(metalField(place))}
          >
            <MetalOptions typed={layer.metal} />
          </select>
        </span>
        <span className="est-layer__thick">
          <input
            className="input"
            aria-label={`Thickness of layer ${place}, ${unit}`}
            inputMode="decimal"
            autoComplete="off"
            maxLength={12}
            value={layer.thickness}
            onChange={(event) => change({ thickness: event.target.value })}
            {...wire(thicknessField(place))}
          />
          <span aria-hidden="true">to</span>
          <input
            className="input"
            aria-label={`Thickness of layer ${place} at most, ${unit}: empty if it is exact`}
            inputMode="decimal"
            autoComplete="off"
            maxLength={12}
            value={layer.to}
            onChange={(event) => change({ to: event.target.value })}
            {...wire(toField(place))}
          />
          <span className="est-layer__unit">{unit}</span>
        </span>
        {place > 1 && <DownButton place={place} press={() => onChange(changeStack(typed, `down-${place}`))} />}
      </div>
      {error && (
        <p className="field__error" id={errorId}>
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
      <p className="est-layer__words">
        {weighed && `${massWords(weighed.massG)} in all`}
        {weighed && !isToScale && ". "}
        {!isToScale && <em>Not to scale</em>}
      </p>
    </li>
  );
}

/** What was typed stays in the list even where it is no metal, so that the fault beside it makes sense. */
function MetalOptions({ typed }: { typed: string }) {
  const isKnown = DEPOSIT_METALS.some((symbol) => symbol === typed);
  return (
    <>
      {!isKnown && <option value={typed}>{typed === "" ? "Choose" : typed}</option>}
      {DEPOSIT_METALS.map((symbol) => (
        <option key={symbol} value={symbol}>
          {metalTitle(symbol)}
        </option>
      ))}
    </>
  );
}

function DownButton({ place, press }: { place: number; press: () => void }) {
  return (
    <button
      className="icon-btn est-layer__down"
      type="submit"
      name="do"
      value={`down-${place}`}
      aria-label={`Layer ${place} one place down`}
      onClick={(event) => {
        event.preventDefault();
        press();
      }}
    >
      <Glyph name="ui-down" size={22} />
    </button>
  );
}
