import { errorOf, many, one } from "@/components/library/entry-choices";
import type { EntryFieldsProps } from "@/components/library/entry-class-fields";
import { EntryStepRow } from "@/components/library/entry-step-row";
import { NameChecks } from "@/components/library/name-checks";
import { useRows } from "@/components/library/use-rows";
import { Button } from "@/components/ui/button";
import { Field, TextAreaField } from "@/components/ui/field";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

const { lineChars, textChars } = LIBRARY_LIMITS;

/** What a fix puts right, its steps, when to leave it alone. */
export function EntryFixFields(props: EntryFieldsProps) {
  const { values, errors, choices } = props;
  return (
    <>
      <Field label="Name" name="title" maxLength={lineChars} defaultValue={one(values, "title")} error={errors.title} />
      <NameChecks
        legend="Puts right"
        name="causeSlugs"
        options={choices.causes.map((cause) => ({ value: cause.slug, label: cause.title, hint: cause.of }))}
        chosen={many(values, "causeSlugs")}
        error={errorOf(errors, "causeSlugs")}
        folded
      />
      <StepRows {...props} />
      <TextAreaField
        label="When not to"
        name="whenNot"
        hint="When to leave it alone and do something else."
        maxLength={textChars}
        defaultValue={one(values, "whenNot")}
        error={errors.whenNot}
      />
      <TextAreaField
        label="Have ready"
        name="materials"
        hint="One a line."
        defaultValue={one(values, "materials")}
        error={errorOf(errors, "materials")}
      />
    </>
  );
}

function StepRows({ values, errors, choices, onRows }: EntryFieldsProps) {
  const { rows, add, remove, raise } = useRows("steps", values);
  return (
    <fieldset className="entry-rows">
      <legend>Steps</legend>
      <p className="field__hint">In the order in which they are done. A row without words is left out.</p>
      {errors.steps && <p className="field__error">{errors.steps}</p>}
      {rows.map((row, index) => (
        <EntryStepRow key={row.id} row={row.values} index={index} errors={errors} choices={choices}>
          {index > 0 && (
            <Button variant="quiet" onClick={() => (raise(row.id), onRows())}>
              Move step {index + 1} up
            </Button>
          )}
          <Button variant="quiet" onClick={() => (remove(row.id), onRows())}>
            Take step {index + 1} out
          </Button>
        </EntryStepRow>
      ))}
      <Button onClick={() => (add(), onRows())}>Add a step</Button>
    </fieldset>
  );
}
