"use client";

import { useActionState } from "react";
import { useAnswerFocus } from "@/components/cases/use-answer-focus";
import { StripBathFields, type StripBathView } from "@/components/costs/strip-bath-fields";
import type { WayAction } from "@/components/costs/strip-way-form";
import { FormAnswer } from "@/components/crew/form-answer";
import { CheckField } from "@/components/ui/check-field";
import { Field } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { PickGroup } from "@/components/ui/pick";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { STRIP_LIMITS } from "@/lib/costs/strip-row.schema";

export interface StripAddFormProps {
  id: string;
  bath: StripBathView;
  metals: readonly { symbol: string; name: string }[];
  action: WayAction;
}

/** Adds a bath of the shop's own. */
export function StripAddForm({ id, bath, metals, action }: StripAddFormProps) {
  const [state, send] = useActionState(action, null);
  const form = useAnswerFocus(state);
  return (
    <form className="strip-way-form" id={id} action={send} ref={form}>
      <FormAnswer state={state} />
      <PickGroup
        key={typed(state, "method", "chemical")}
        legend="How it works"
        name="method"
        kind="radio"
        layout="bar"
        required
        options={[
          { value: "chemical", label: "Immersion" },
          { value: "electrolytic", label: "With current" },
        ]}
        defaultValue={typed(state, "method", "chemical")}
        error={fieldFault(state, "method")}
      />
      <TakesOff metals={metals} state={state} />
      <Field
        label="Solution"
        name="solution"
        required
        maxLength={STRIP_LIMITS.solutionChars}
        hint="What is in it, and how much of it."
        defaultValue={typed(state, "solution")}
        error={fieldFault(state, "solution")}
      />
      <div className="form__pair">
        <Field
          label="From"
          name="tempLow"
          inputMode="decimal"
          unit="°C"
          required
          defaultValue={typed(state, "tempLow")}
          error={fieldFault(state, "tempLow")}
        />
        <Field
          label="To"
          name="tempHigh"
          inputMode="decimal"
          unit="°C"
          required
          defaultValue={typed(state, "tempHigh")}
          error={fieldFault(state, "tempHigh")}
        />
      </div>
      <Field
        label="Volts or current"
        name="current"
        optional
        maxLength={60}
        hint="“6 V, about 5 A/dm²”. Empty for an immersion."
        defaultValue={typed(state, "current")}
        error={fieldFault(state, "current")}
      />
      <StripBathFields view={bath} state={state} />
      <SubmitButton variant="main" className="desk-only">
        Add this way
      </SubmitButton>
    </form>
  );
}

function TakesOff({ metals, state }: { metals: StripAddFormProps["metals"]; state: ActState<unknown> }) {
  const sent = state && !state.ok ? [state.values.takesOff ?? []].flat() : [];
  const error = fieldFault(state, "takesOff");
  return (
    <fieldset className="strip-takes">
      <legend>Takes off</legend>
      <div className="strip-takes__metals">
        {metals.map(({ symbol, name }) => (
          <CheckField
            key={`${symbol}-${String(sent.includes(symbol))}`}
            label={name}
            name="takesOff[]"
            value={symbol}
            defaultChecked={sent.includes(symbol)}
            aria-invalid={error ? true : undefined}
          />
        ))}
      </div>
      {error && (
        <p className="field__error">
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </fieldset>
  );
}
