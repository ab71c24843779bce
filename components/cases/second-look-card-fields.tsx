"use client";

import { StepCautions } from "@/components/cases/second-look-cautions";
import { Button } from "@/components/ui/button";
import { Field, TextAreaField } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import type { DraftStep } from "@/lib/cases/card-draft";
import { LIMITS } from "@/lib/cases/case-words";
import type { SecondLookChange, SecondLookOffer } from "@/lib/cases/second-look-form";

interface FieldsProps {
  steps: readonly DraftStep[];
  cautions: SecondLookOffer["cautions"];
  onChange: (change: SecondLookChange) => void;
}

/** The card's steps as fields: words, minutes, order. Their cautions are shown and cannot be taken off. */
export function CardStepFields({ steps, cautions, onChange }: FieldsProps) {
  return (
    <div className="step-fields">
      <ol>
        {steps.map((step, index) => (
          <li key={step.key}>
            <StepFields step={step} place={index + 1} onChange={onChange} />
            <StepCautions keys={step.cautionKeys} cautions={cautions} />
            <StepButtons step={step} place={index + 1} isLast={index === steps.length - 1} onChange={onChange} />
          </li>
        ))}
      </ol>
      <Button glyph="ui-plus" onClick={() => onChange({ type: "add" })}>
        Add a step
      </Button>
    </div>
  );
}

interface StepProps {
  step: DraftStep;
  place: number;
  onChange: FieldsProps["onChange"];
}

function StepFields({ step, place, onChange }: StepProps) {
  const change = (words: Partial<Pick<DraftStep, "title" | "detail" | "minutes">>) =>
    onChange({ type: "step", key: step.key, change: words });
  return (
    <>
      <div className="step-fields__head">
        <Field
          label={`Step ${place}`}
          name={`title-${step.key}`}
          value={step.title}
          maxLength={LIMITS.nameChars}
          onChange={(event) => change({ title: event.target.value })}
        />
        <Field
          label="Minutes"
          name={`minutes-${step.key}`}
          unit="min"
          inputMode="numeric"
          value={step.minutes}
          onChange={(event) => change({ minutes: event.target.value })}
        />
      </div>
      <TextAreaField
        label="What to do"
        name={`detail-${step.key}`}
        rows={2}
        value={step.detail}
        maxLength={LIMITS.noteChars}
        onChange={(event) => change({ detail: event.target.value })}
      />
    </>
  );
}

function StepButtons({ step, place, isLast, onChange }: StepProps & { isLast: boolean }) {
  const name = step.title || `step ${place}`;
  return (
    <div className="btns">
      <Button
        aria-label={`Up: ${name}`}
        disabled={place === 1}
        onClick={() => onChange({ type: "move", key: step.key, by: -1 })}
      >
        Up
      </Button>
      <Button
        aria-label={`Down: ${name}`}
        disabled={isLast}
        onClick={() => onChange({ type: "move", key: step.key, by: 1 })}
      >
        Down
      </Button>
      <Button
        variant="hold"
        aria-label={`Take off: ${name}`}
        onClick={() => onChange({ type: "remove", key: step.key })}
      >
        <Glyph name="ui-cross" size={20} /> Take off
      </Button>
    </div>
  );
}
