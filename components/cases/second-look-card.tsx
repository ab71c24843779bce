"use client";

import { useState } from "react";
import { CardStepFields } from "@/components/cases/second-look-card-fields";
import { StepCautions } from "@/components/cases/second-look-cautions";
import { Button } from "@/components/ui/button";
import { SelectField } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { Section } from "@/components/ui/section";
import { draftMinutes, type DraftStep } from "@/lib/cases/card-draft";
import {
  chosenFix,
  fixesOf,
  stepsOf,
  type SecondLookChange,
  type SecondLookForm,
  type SecondLookOffer,
} from "@/lib/cases/second-look-form";

interface CardProps {
  form: SecondLookForm;
  offer: SecondLookOffer;
  onChange: (change: SecondLookChange) => void;
  error?: string;
}

/** The rework card to send: the library's fix for the cause, changed where this part needs it. */
export function SecondLookCard({ form, offer, onChange, error }: CardProps) {
  const [isEditing, setEditing] = useState(false);
  const steps = stepsOf(form, offer);
  const fix = chosenFix(form, offer);
  const aside =
    form.causeId === null ? undefined : (
      <Button variant="quiet" keyCap="C" aria-pressed={isEditing} onClick={() => setEditing(!isEditing)}>
        {isEditing ? "Done" : "Edit steps"}
      </Button>
    );
  return (
    <Section title="Rework card to send" className="card-to-send" aside={aside}>
      {form.causeId === null ? (
        <p className="small mid">Name the cause, and the library&apos;s card for it stands here.</p>
      ) : (
        <>
          <FixChoice form={form} offer={offer} onChange={onChange} />
          {fix && fix.whenNot !== "" && (
            <p className="when-not">
              <Glyph name="ui-caution" size={22} />
              <span>
                <b>When not: </b>
                {fix.whenNot}
              </span>
            </p>
          )}
          {isEditing ? (
            <CardStepFields steps={steps} cautions={offer.cautions} onChange={onChange} />
          ) : (
            <StepRow steps={steps} cautions={offer.cautions} />
          )}
          <p className="rests">
            {steps.length} {steps.length === 1 ? "step" : "steps"}, {draftMinutes(steps)} min planned for{" "}
            {offer.quantity === 1 ? "1 part" : `${offer.quantity} parts`}. Times from the library; the card records what
            it took.
          </p>
        </>
      )}
      {error && (
        <p className="field__error" role="alert">
          <Glyph name="ui-caution" size={20} />
          {error}
        </p>
      )}
    </Section>
  );
}

/** Which of the library's fixes, where it names more than one, or a card written from nothing. */
function FixChoice({ form, offer, onChange }: Omit<CardProps, "error">) {
  const fixes = fixesOf(form, offer);
  const fix = chosenFix(form, offer);
  return (
    <SelectField
      className="fix-choice"
      label="Fix"
      name="fix"
      value={String(fix?.id ?? 0)}
      onChange={(event) => onChange({ type: "fix", id: Number(event.target.value) })}
      options={[
        ...fixes.map(({ id, title }) => ({ value: String(id), label: title })),
        { value: "0", label: "A card of my own" },
      ]}
    />
  );
}

interface StepRowProps {
  steps: readonly DraftStep[];
  cautions: SecondLookOffer["cautions"];
}

function StepRow({ steps, cautions }: StepRowProps) {
  if (steps.length === 0) return <p className="small mid">No steps yet. Press Edit steps and add the first.</p>;
  return (
    <ol className="step-row">
      {steps.map((step) => (
        <li key={step.key}>
          <div>
            <b>{step.title || "Step without a name"}</b>
            <span className="fig">{step.minutes || 0} min</span>
            {step.detail && <p>{step.detail}</p>}
          </div>
          <div className="step-row__cautions">
            <StepCautions keys={step.cautionKeys} cautions={cautions} />
          </div>
        </li>
      ))}
    </ol>
  );
}
