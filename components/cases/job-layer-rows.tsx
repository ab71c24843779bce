import { Field, SelectField } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { LAYER_PLACES, layerMetalName, layerThicknessName } from "@/lib/cases/job.schema";
import { USUAL_STRIKE_UM } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS, metalOf } from "@/lib/plating/metals";

export interface JobLayerRowsProps {
  state: ActState;
  /** What stands in the rows to begin with, from the strike out. */
  layers?: readonly { metal: string; thicknessUm: number }[];
}

const METAL_OPTIONS = DEPOSIT_METALS.map((symbol) => ({
  value: symbol,
  label: `${capital(metalOf(symbol).name)} (${symbol})`,
}));

/** The layers that come on the strike, one row each, numbered from the base out. */
export function JobLayerRows({ state, layers = [] }: JobLayerRowsProps) {
  const error = fieldFault(state, "layers");
  return (
    <fieldset className="job-layers" aria-describedby={error ? "job-layers-hint job-layers-error" : "job-layers-hint"}>
      <legend>Layers after the strike</legend>
      <p className="field__hint" id="job-layers-hint">
        From the base out. Layer 1 is the copper strike, taken as {USUAL_STRIKE_UM} µm. Leave the rest empty if the
        strike is all.
      </p>
      {LAYER_PLACES.map((place, index) => (
        <div className="job-layer" key={place}>
          <SelectField
            label={`Layer ${place}`}
            name={layerMetalName(place)}
            placeholder="None"
            options={METAL_OPTIONS}
            defaultValue={typed(state, layerMetalName(place), layers[index]?.metal)}
            error={fieldFault(state, layerMetalName(place))}
          />
          <Field
            label={
              <>
                Thickness<span className="sr-only"> of layer {place}</span>
              </>
            }
            name={layerThicknessName(place)}
            unit="µm"
            inputMode="decimal"
            defaultValue={typed(state, layerThicknessName(place), layers[index]?.thicknessUm.toString())}
            error={fieldFault(state, layerThicknessName(place))}
          />
        </div>
      ))}
      {error && (
        <p className="field__error" id="job-layers-error">
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </fieldset>
  );
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
