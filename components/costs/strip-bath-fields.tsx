import { StripMetals, type StripMetalView } from "@/components/costs/strip-metals";
import { ThreeFields, type ThreeFieldsView } from "@/components/costs/three-fields";
import { CheckField } from "@/components/ui/check-field";
import { Field, TextAreaField } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { STRIP_LIMITS } from "@/lib/costs/strip-row.schema";

export interface StripCautionView {
  key: string;
  words: string;
  stop: boolean;
  chosen: boolean;
  /** Ships with the way: it cannot be taken away. */
  fixed: boolean;
}

export interface StripBathView {
  rate: ThreeFieldsView;
  holding: ThreeFieldsView;
  price: string;
  /** "$6.10 / L": what holds now. Absent for a way that is new. */
  priceNow?: string;
  /** Beside the price: "$ / L". */
  priceUnit: string;
  metals: readonly StripMetalView[];
  cautions: readonly StripCautionView[];
  source: string;
  rateSource: string;
}

/** What the shop sets of a bath: rate, what a litre holds, price, base metals, cautions, and where it all comes from. */
export function StripBathFields({ view, state }: { view: StripBathView; state: ActState<unknown> }) {
  return (
    <>
      <ThreeFields view={view.rate} state={state} />
      <ThreeFields view={view.holding} state={state} />
      <TextAreaField
        label="Where the figures come from"
        name="rateSource"
        rows={2}
        required
        maxLength={STRIP_LIMITS.sourceChars}
        hint="“Measured here, 12 panels, 3 Aug 2026.” It stands beside every estimate that rests on them."
        defaultValue={typed(state, "rateSource", view.rateSource)}
        error={fieldFault(state, "rateSource")}
      />
      <Field
        label="Price of a litre made up"
        name="price"
        inputMode="decimal"
        unit={view.priceUnit}
        hint={`${view.priceNow ? `Now ${view.priceNow}. ` : ""}Empty: the shop’s one price for strip solution.`}
        defaultValue={typed(state, "price", view.price)}
        error={fieldFault(state, "price")}
      />
      <StripMetals metals={view.metals} state={state} />
      <TextAreaField
        label="Where solution and base metals come from"
        name="source"
        rows={2}
        required
        maxLength={STRIP_LIMITS.sourceChars}
        defaultValue={typed(state, "source", view.source)}
        error={fieldFault(state, "source")}
      />
      <Cautions cautions={view.cautions} state={state} />
    </>
  );
}

function Cautions({ cautions, state }: { cautions: readonly StripCautionView[]; state: ActState<unknown> }) {
  const sent = state && !state.ok ? [state.values.cautions ?? []].flat() : null;
  const fixed = cautions.filter((caution) => caution.fixed);
  const free = cautions.filter((caution) => !caution.fixed);
  return (
    <fieldset className="strip-cautions">
      <legend>Cautions beside the step</legend>
      {fixed.length > 0 && (
        <ul aria-label="Always shown">
          {fixed.map((caution) => (
            <li key={caution.key}>
              <Glyph name={caution.stop ? "ui-stop" : "ui-caution"} label={caution.stop ? "Stop" : "Caution"} />
              <span>{caution.words}</span>
            </li>
          ))}
        </ul>
      )}
      <details open={free.some((caution) => caution.chosen) || undefined}>
        <summary>{fixed.length > 0 ? "Add more" : "Choose them"}</summary>
        {free.map((caution) => (
          <CheckField
            key={`${caution.key}-${String(sent?.includes(caution.key))}`}
            label={caution.words}
            name="cautions[]"
            value={caution.key}
            defaultChecked={sent ? sent.includes(caution.key) : caution.chosen}
          />
        ))}
      </details>
    </fieldset>
  );
}
