import { useId } from "react";
import { Glyph } from "@/components/ui/glyph";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import {
  reasonFieldName,
  standingFieldName,
  STANDING_TITLES,
  STANDINGS,
  type NamedBaseMetal,
  type Standing,
} from "@/lib/costs/strip-row-fields";

export interface StripMetalView {
  metal: NamedBaseMetal;
  label: string;
  standing: Standing;
  reason: string;
}

/** How a bath stands to each base metal. What is left at "nobody vouches" is never offered on that metal. */
export function StripMetals({ metals, state }: { metals: readonly StripMetalView[]; state: ActState<unknown> }) {
  return (
    <fieldset className="strip-metals">
      <legend>On which base metals</legend>
      <p className="small mid">
        Offered only where it is marked safe. Say how you know; where it goes on into the part, say what it does.
      </p>
      {metals.map((metal) => (
        <MetalRow key={metal.metal} view={metal} state={state} />
      ))}
    </fieldset>
  );
}

function MetalRow({ view, state }: { view: StripMetalView; state: ActState<unknown> }) {
  const id = useId();
  const why = reasonFieldName(view.metal);
  const chosen = typed(state, standingFieldName(view.metal), view.standing);
  const error = fieldFault(state, why);
  return (
    <div className="strip-metal">
      <label htmlFor={`${id}-on`}>
        {view.label}
        {chosen !== view.standing && <small>now {STANDING_TITLES[view.standing].toLowerCase()}</small>}
      </label>
      <select key={chosen} className="input" id={`${id}-on`} name={standingFieldName(view.metal)} defaultValue={chosen}>
        {STANDINGS.map((standing) => (
          <option key={standing} value={standing}>
            {STANDING_TITLES[standing]}
          </option>
        ))}
      </select>
      <input
        className="input strip-metal__why"
        name={why}
        aria-label={`Why, for ${view.label.toLowerCase()}`}
        placeholder="Why"
        autoComplete="off"
        defaultValue={typed(state, why, view.reason)}
        aria-invalid={error ? true : undefined}
        aria-describedby={error ? `${id}-error` : undefined}
      />
      {error && (
        <p className="field__error" id={`${id}-error`}>
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </div>
  );
}
