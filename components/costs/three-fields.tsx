import { useId } from "react";
import { Glyph } from "@/components/ui/glyph";
import { fieldFault, typed, type ActState } from "@/lib/act-state";

export interface ThreeFieldsView {
  /** Names of the three fields begin with it: "rate" makes rateLow, rateLikely, rateHigh. */
  name: string;
  label: string;
  unit: string;
  note?: string;
  /** "0.1 · 0.25 · 0.5 µm/min": what holds now. Absent for a way that is new. */
  now?: string;
  values: readonly [low: string, likely: string, high: string];
}

const ENDS = ["Low", "Likely", "High"] as const;

/** A figure that nobody knows exactly: three fields in a row, low to high. */
export function ThreeFields({ view, state }: { view: ThreeFieldsView; state: ActState<unknown> }) {
  const id = useId();
  const errors = ENDS.flatMap((end) => {
    const error = fieldFault(state, `${view.name}${end}`);
    return error ? [{ end, error }] : [];
  });
  return (
    <fieldset className="three">
      <legend>
        {view.label} <small>{view.unit}</small>
      </legend>
      {view.note && <p className="small mid">{view.note}</p>}
      {view.now && <p className="three__now">now {view.now}</p>}
      <div className="three__fields">
        {ENDS.map((end, index) => (
          <label key={end}>
            {end}
            <input
              className="input"
              name={`${view.name}${end}`}
              inputMode="decimal"
              autoComplete="off"
              required
              defaultValue={typed(state, `${view.name}${end}`, view.values[index])}
              aria-invalid={errors.some((each) => each.end === end) || undefined}
              aria-describedby={errors.length > 0 ? `${id}-errors` : undefined}
            />
          </label>
        ))}
      </div>
      {errors.length > 0 && (
        <div id={`${id}-errors`}>
          {errors.map(({ end, error }) => (
            <p key={end} className="field__error">
              <Glyph name="ui-caution" size={20} />
              {end}: {error}
            </p>
          ))}
        </div>
      )}
    </fieldset>
  );
}
