import { errorOf, many, one } from "@/components/library/entry-choices";
import type { EntryFieldsProps } from "@/components/library/entry-class-fields";
import { NameChecks } from "@/components/library/name-checks";
import { Field, SelectField, TextAreaField } from "@/components/ui/field";
import { BASE_METAL_TITLES, BASE_METALS } from "@/lib/cases/case-words";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

const { lineChars, textChars } = LIBRARY_LIMITS;

/** Where a cause arises, what it shows as, how it is proved. */
export function EntryCauseFields({ values, errors, choices }: EntryFieldsProps) {
  const classes = choices.classes.map((each) => ({ value: each.slug, label: each.title }));
  const text = (name: string, label: string, hint: string) => (
    <TextAreaField
      label={label}
      name={name}
      hint={hint}
      maxLength={textChars}
      defaultValue={one(values, name)}
      error={errors[name]}
    />
  );
  return (
    <>
      <Field label="Name" name="title" maxLength={lineChars} defaultValue={one(values, "title")} error={errors.title} />
      <div className="form__pair">
        <SelectField
          label="Where on the line"
          name="station"
          placeholder="Choose a station"
          options={choices.stations.map((station) => ({ value: station.kind, label: station.name }))}
          defaultValue={one(values, "station")}
          error={errors.station}
        />
        <SelectField
          label="Shows most as"
          name="classSlug"
          placeholder="Choose a class"
          options={classes}
          defaultValue={one(values, "classSlug")}
          error={errorOf(errors, "classSlugs")}
        />
      </div>
      <NameChecks
        legend="Shows as these too"
        name="classSlugs"
        options={classes}
        chosen={many(values, "classSlugs")}
        folded
      />
      {text("why", "Why it happens", "What goes on in the tank or on the part.")}
      {text("proof", "Proof", "A check that proves it or rules it out.")}
      <Field
        label="Share of its class’s cases"
        name="likelihood"
        hint="From memory; this shop’s own cases are set beside it."
        unit="%"
        inputMode="decimal"
        defaultValue={one(values, "likelihood")}
        error={errors.likelihood}
      />
      <NameChecks
        legend="Base metals at risk"
        name="baseMetals"
        options={BASE_METALS.map((metal) => ({ value: metal, label: BASE_METAL_TITLES[metal] }))}
        chosen={many(values, "baseMetals")}
        error={errorOf(errors, "baseMetals")}
        folded
      />
      <TextAreaField
        label="What people also say"
        name="synonyms"
        hint="One a line: the shop’s own words, so that the search finds it."
        defaultValue={one(values, "synonyms")}
        error={errorOf(errors, "synonyms")}
      />
    </>
  );
}
