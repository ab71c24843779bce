"use client";

import { StripArea } from "@/components/costs/estimate-area";
import type { StripEditing } from "@/components/costs/estimate-editing";
import { Field } from "@/components/ui/field";
import { FieldFrame } from "@/components/ui/field-wiring";
import { Glyph } from "@/components/ui/glyph";
import { PickGroup } from "@/components/ui/pick";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import { LIMITS } from "@/lib/cases/case-words";
import type { StripBatch } from "@/lib/costs/read-strip";
import { figureWords } from "@/lib/costs/strip-words";

interface StripBatchFieldsProps extends StripEditing {
  currencySign: string;
  /** Where the fields were filled in from. */
  filledFrom: string;
}

/** How much of it there is: parts, area, value, and where it was found. */
export function StripBatchFields({ currencySign, filledFrom, ...editing }: StripBatchFieldsProps) {
  const { typed, faults, onChange, reading } = editing;
  return (
    <Section title="How much of it" className="est-batch">
      <div className="est-batch__fields">
        <PartsField {...editing} />
        <Field
          label="Part value, each"
          name="value"
          placeholder="none"
          unit={currencySign}
          inputMode="decimal"
          maxLength={14}
          value={typed.value}
          onChange={(event) => onChange({ ...typed, value: event.target.value })}
          error={faults.value}
        />
        <StripArea {...editing} />
        <div className="est-batch__found">
          <PickGroup
            legend="Found"
            name="found"
            kind="radio"
            layout="bar"
            options={[
              { value: "at-strike", label: "At the strike" },
              { value: "after-final-plate", label: "After final plate" },
              { value: "returned", label: "Returned" },
            ]}
            value={typed.found}
            onChange={(event) => onChange({ ...typed, found: event.target.value })}
            error={faults.found}
          />
        </div>
      </div>
      <Rests>
        {reading.batch && `${allWords(reading.batch)} `}
        {filledFrom}
      </Rests>
    </Section>
  );
}

function allWords({ quantity, areaDm2 }: StripBatch): string {
  return `${figureWords(quantity * areaDm2)} dm² in all.`;
}

function PartsField({ typed, faults, onChange }: StripEditing) {
  const parts = Number(typed.parts);
  const step = (by: number) =>
    onChange({
      ...typed,
      parts: String(Math.min(LIMITS.quantity, Math.max(1, (Number.isInteger(parts) ? parts : 0) + by))),
    });
  return (
    <FieldFrame words={{ label: "Parts", error: faults.parts }}>
      {(wiring) => (
        <span className="est-step">
          <button type="button" aria-label="One part fewer" onClick={() => step(-1)}>
            <span className="count__minus" aria-hidden="true" />
          </button>
          <input
            name="parts"
            inputMode="numeric"
            autoComplete="off"
            maxLength={9}
            value={typed.parts}
            onChange={(event) => onChange({ ...typed, parts: event.target.value.trim() })}
            {...wiring}
          />
          <button type="button" aria-label="One part more" onClick={() => step(1)}>
            <Glyph name="ui-plus" size={22} />
          </button>
        </span>
      )}
    </FieldFrame>
  );
}
