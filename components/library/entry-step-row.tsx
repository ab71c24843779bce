import type { ReactNode } from "react";
import { errorOf, many, one, type EntryChoices, type FieldErrors } from "@/components/library/entry-choices";
import { NameChecks } from "@/components/library/name-checks";
import { Field, SelectField, TextAreaField } from "@/components/ui/field";
import type { FormValues } from "@/lib/library/entry-form";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

interface EntryStepRowProps {
  row: FormValues;
  index: number;
  errors: FieldErrors;
  choices: EntryChoices;
  /** The buttons that move it and take it out. */
  children: ReactNode;
}

/** One step of a fix. */
export function EntryStepRow({ row, index, errors, choices, children }: EntryStepRowProps) {
  const at = (name: string) => `steps.${index}.${name}`;
  const number = index + 1;
  return (
    <div className="entry-row">
      <Field
        label={`Step ${number}`}
        name={at("title")}
        maxLength={LIBRARY_LIMITS.lineChars}
        defaultValue={one(row, "title")}
        error={errors[at("title")]}
      />
      <TextAreaField
        label={`What to do in step ${number}`}
        name={at("detail")}
        maxLength={LIBRARY_LIMITS.textChars}
        defaultValue={one(row, "detail")}
        error={errors[at("detail")]}
      />
      <div className="entry-row__three">
        <Field
          label="Working time"
          name={at("minutes")}
          unit="min"
          inputMode="decimal"
          defaultValue={one(row, "minutes")}
          error={errors[at("minutes")]}
        />
        <SelectField
          label="For"
          name={at("per")}
          options={[
            { value: "batch", label: "The batch" },
            { value: "part", label: "Each part" },
          ]}
          defaultValue={one(row, "per") || "batch"}
        />
        <SelectField
          label="Where"
          name={at("station")}
          placeholder="At the bench"
          options={choices.stations.map((station) => ({ value: station.kind, label: station.name }))}
          defaultValue={one(row, "station")}
          error={errors[at("station")]}
        />
      </div>
      <NameChecks
        legend={`Cautions of step ${number}`}
        name={at("cautionKeys")}
        options={choices.cautions.map((caution) => ({
          value: caution.key,
          label: caution.text,
          hint: caution.level === "stop" ? "Stop" : undefined,
        }))}
        chosen={many(row, "cautionKeys")}
        error={errorOf(errors, at("cautionKeys"))}
        folded
      />
      <div className="btns">{children}</div>
    </div>
  );
}
