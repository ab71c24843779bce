import type { ReactNode } from "react";
import { filterFieldId } from "@/components/cases/casebook-sentence";
import { Button } from "@/components/ui/button";
import { Field, SelectField, type SelectOption } from "@/components/ui/field";
import { Glyph } from "@/components/ui/glyph";
import { STANDING_WORDS, type CasebookChoices } from "@/lib/cases/casebook-filter";
import { BASE_METAL_TITLES, BASE_METALS, STAGE_TITLES, STAGES_FOUND } from "@/lib/cases/case-words";
import { CASE_STANDINGS, type CasebookQuery, type FilterName } from "@/lib/cases/casebook.schema";

interface CasebookFiltersProps {
  query: CasebookQuery;
  choices: CasebookChoices;
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

const METALS = BASE_METALS.map((value) => ({ value, label: BASE_METAL_TITLES[value] }));
const STAGES = STAGES_FOUND.map((value) => ({ value, label: STAGE_TITLES[value] }));
const STANDINGS = CASE_STANDINGS.map((value) => ({ value, label: capital(STANDING_WORDS[value]) }));

const EXEMPLARS = [{ value: "only", label: "Exemplars only" }];

/** Every filter as a field, folded away until somebody changes the sentence. */
export function CasebookFilters({ query, choices }: CasebookFiltersProps) {
  const classes = choices.classes.map((each) => ({ value: each.slug, label: each.title }));
  const causes = choices.causes.map((each) => ({ value: each.slug, label: each.title }));
  const stations = choices.stations.map((each) => ({ value: each.slug, label: each.name }));
  const customers = choices.customers.map((each) => ({ value: String(each.id), label: each.name }));
  const members = choices.members.map((each) => ({ value: String(each.id), label: each.name }));
  const choose = (name: FilterName, label: string, any: string, options: SelectOption[]) => (
    <Place name={name}>
      <SelectField
        label={label}
        name={name}
        placeholder={any}
        options={options}
        defaultValue={String(query[name] ?? "")}
      />
    </Place>
  );
  return (
    <details className="cb-filters">
      <summary className="btn btn--plain">
        <Glyph name="ui-down" />
        <span className="btn__label">Change the words</span>
      </summary>
      <div className="cb-filters__in">
        {choose("class", "Class", "Any class", classes)}
        {choose("metal", "Base metal", "Any metal", METALS)}
        {choose("station", "Began at", "Anywhere on the line", stations)}
        {choose("status", "Stands", "In any state", STANDINGS)}
        {choose("cause", "Cause", "Any cause", causes)}
        {choose("stage", "Found", "At any stage", STAGES)}
        {choose("customer", "Customer", "Any customer", customers)}
        {choose("by", "Snapped by", "Anybody", members)}
        {choose("exemplars", "Photos", "With or without exemplar", EXEMPLARS)}
        <Place name="openedFrom">
          <Field label="Opened from" name="openedFrom" type="date" defaultValue={query.openedFrom} />
        </Place>
        <Place name="openedTo">
          <Field label="Opened by" name="openedTo" type="date" defaultValue={query.openedTo} />
        </Place>
        <Place name="closedFrom">
          <Field label="Closed from" name="closedFrom" type="date" defaultValue={query.closedFrom} />
        </Place>
        <Place name="closedTo">
          <Field label="Closed by" name="closedTo" type="date" defaultValue={query.closedTo} />
        </Place>
        <div className="cb-filters__show">
          <Button type="submit" wide>
            Show these cases
          </Button>
        </div>
      </div>
    </details>
  );
}

function Place({ name, children }: { name: FilterName; children: ReactNode }) {
  return <div id={filterFieldId(name)}>{children}</div>;
}
