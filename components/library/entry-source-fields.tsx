import { errorOf, many, one, type EntryChoices, type FieldErrors } from "@/components/library/entry-choices";
import { NameChecks } from "@/components/library/name-checks";
import { SelectField, TextAreaField } from "@/components/ui/field";
import type { FormValues } from "@/lib/library/entry-form";
import type { SourceKind } from "@/lib/library/library-entry";
import { LIBRARY_LIMITS } from "@/lib/library/library.schema";

const KINDS: Record<SourceKind, string> = {
  published: "Published: a standard, a book, a data sheet",
  "common-practice": "Common practice",
  "from-memory": "From memory",
};

interface EntrySourceFieldsProps {
  values: FormValues;
  errors: FieldErrors;
  sources: EntryChoices["sources"];
}

/** Where the facts come from: the shop's sources to tick, and room for one that it has not yet. */
export function EntrySourceFields({ values, errors, sources }: EntrySourceFieldsProps) {
  return (
    <NameChecks
      legend="Sources"
      hint="Every fact has one: what is only remembered says so."
      name="sourceKeys"
      options={sources.map((source) => ({
        value: source.key,
        label: source.citation,
        hint: source.kind === "published" ? undefined : KINDS[source.kind],
      }))}
      chosen={many(values, "sourceKeys")}
      error={errorOf(errors, "sourceKeys")}
      folded
    >
      <details className="entry-names__rest" open={one(values, "newCitation") !== "" || undefined}>
        <summary>A source that is not listed</summary>
        <div className="form entry-names__new">
          <SelectField
            label="Kind of source"
            name="newKind"
            options={Object.entries(KINDS).map(([value, label]) => ({ value, label }))}
            defaultValue={one(values, "newKind") || "published"}
          />
          <TextAreaField
            label="Citation"
            name="newCitation"
            hint="Who wrote it, what it is called, edition or year, the section."
            maxLength={LIBRARY_LIMITS.textChars}
            rows={2}
            defaultValue={one(values, "newCitation")}
            error={errors.newCitation}
          />
        </div>
      </details>
    </NameChecks>
  );
}
