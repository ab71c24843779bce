import Form from "next/form";
import type { ReactNode } from "react";
import { CasebookFilters } from "@/components/cases/casebook-filters";
import { Button } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import type { CasebookChoices } from "@/lib/cases/casebook-filter";
import { CASEBOOK_LIMITS, type CasebookQuery } from "@/lib/cases/casebook.schema";
import { routes } from "@/lib/routes";

interface CasebookFormProps {
  query: CasebookQuery;
  choices: CasebookChoices;
  /** Cases that lie in the tray: a new search keeps them. */
  beside?: readonly string[];
  /** Under the search field: how its words were read. */
  reading?: ReactNode;
}

/** Search and filters: an ordinary form that asks for a page, with script or without. */
export function CasebookForm({ query, choices, beside = [], reading }: CasebookFormProps) {
  return (
    // The key: a link that drops a filter must also empty its field.
    <Form action={routes.casebook()} prefetch={false} className="cb-form" key={JSON.stringify(query)} role="search">
      {query.view && <input type="hidden" name="view" value={query.view} />}
      {query.order && <input type="hidden" name="order" value={query.order} />}
      {beside.length > 0 && <input type="hidden" name="beside" value={beside.join(",")} />}
      <div className="seek cb-seek">
        <Glyph name="ui-find" />
        <input
          type="search"
          name="q"
          aria-label="Search the casebook"
          placeholder="Ref, job, fault, note"
          defaultValue={query.q}
          maxLength={CASEBOOK_LIMITS.queryChars}
          autoComplete="off"
          spellCheck={false}
        />
        <Button type="submit">Find</Button>
      </div>
      {reading}
      <CasebookFilters query={query} choices={choices} />
    </Form>
  );
}
