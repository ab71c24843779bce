import { errorOf, one, type EntryChoices, type FieldErrors } from "@/components/library/entry-choices";
import { useRows } from "@/components/library/use-rows";
import { Button } from "@/components/ui/button";
import { Field, SelectField, TextAreaField } from "@/components/ui/field";
import type { FormValues } from "@/lib/library/entry-form";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

export interface EntryFieldsProps {
  values: FormValues;
  errors: FieldErrors;
  choices: EntryChoices;
  /** Slug of the entry; null while it is new. */
  slug: string | null;
  /** A row was added, moved or taken out: the form reads anew. */
  onRows: () => void;
}

const { lineChars, textChars } = LIBRARY_LIMITS;

/** How a class looks, how it is told, what keeps it away. */
export function EntryClassFields({ values, errors, choices, slug, onRows }: EntryFieldsProps) {
  const text = (name: string, label: string, hint?: string) => (
    <TextAreaField
      label={label}
      name={name}
      hint={hint}
      maxLength={textChars}
      defaultValue={one(values, name)}
      error={errorOf(errors, name)}
    />
  );
  const list = (name: string, label: string, hint: string) => (
    <TextAreaField
      label={label}
      name={name}
      hint={hint}
      defaultValue={one(values, name)}
      error={errorOf(errors, name)}
    />
  );
  return (
    <>
      <Field label="Name" name="title" maxLength={lineChars} defaultValue={one(values, "title")} error={errors.title} />
      <Field
        label="In one line"
        name="short"
        hint="What it looks like at the strike."
        maxLength={lineChars}
        defaultValue={one(values, "short")}
        error={errors.short}
      />
      {text("atStrike", "At the strike")}
      {text("inFinalPlate", "Later, in the final plate", "What the same fault turns into once the final plate is on.")}
      <TellRows values={values} errors={errors} choices={choices} slug={slug} onRows={onRows} />
      {list("checks", "Checks at the bench", "One a line: what settles that it is this and no other.")}
      {list("prevention", "So that it stays away", "One a line.")}
      {text("stripNote", "What taking it off means", "At the strike, and later. The cost is worked out, never typed.")}
      <Field
        label="Share of another cause"
        name="otherLikelihood"
        hint="Of its cases, how many have none of the causes below."
        unit="%"
        inputMode="decimal"
        defaultValue={one(values, "otherLikelihood")}
        error={errors.otherLikelihood}
      />
      {list("synonyms", "What people also say", "One a line: the shop’s own words, so that the search finds it.")}
    </>
  );
}

/** The table of tells: one row for each class that it is mistaken for. */
function TellRows({ values, errors, choices, slug, onRows }: EntryFieldsProps) {
  const { rows, add, remove } = useRows("tells", values);
  const options = choices.classes
    .filter((each) => each.slug !== slug)
    .map((each) => ({ value: each.slug, label: each.title }));
  return (
    <fieldset className="entry-rows">
      <legend>Tell it from its look-alikes</legend>
      {errors.tells && <p className="field__error">{errors.tells}</p>}
      {rows.map((row, index) => (
        <div className="entry-row" key={row.id}>
          <SelectField
            label="It is mistaken for"
            name={`tells.${index}.versus`}
            options={options}
            placeholder="No class"
            defaultValue={one(row.values, "versus")}
            error={errors[`tells.${index}.versus`]}
          />
          <TextAreaField
            label="What this one shows and the other does not"
            name={`tells.${index}.tell`}
            maxLength={textChars}
            rows={2}
            defaultValue={one(row.values, "tell")}
            error={errors[`tells.${index}.tell`]}
          />
          <Button variant="quiet" onClick={() => (remove(row.id), onRows())}>
            Take row {index + 1} out
          </Button>
        </div>
      ))}
      <Button onClick={() => (add(), onRows())}>Add a look-alike</Button>
    </fieldset>
  );
}
