import { FieldChanges } from "@/components/library/word-diff-view";
import { Button } from "@/components/ui/button";
import { SelectField } from "@/components/ui/field";
import { getDb } from "@/db/client";
import { listShelf } from "@/db/queries/library-entries";
import { shippedShelf } from "@/lib/server/library/shipped-shelf";
import { compareEntry } from "@/lib/library/compare-entry";
import { routes } from "@/lib/routes";
import { nameWords } from "../../../entry-choices";
import { rowWords, type RevisionsView } from "./revision-rows";

/** Two revisions to choose, and what differs between them. */
export function Comparison({ entry, slug, rows, before, after, member }: RevisionsView) {
  const options = rows.map((row) => ({ value: String(row.id), label: rowWords(row, member) }));
  const words = nameWords(shippedShelf, listShelf(getDb(), member.shopId));
  return (
    <>
      <form className="form revisions__choice" action={routes.libraryRevisions(entry, slug)}>
        <SelectField label="From" name="before" options={options} defaultValue={String(before.id)} />
        <SelectField label="To" name="after" options={options} defaultValue={String(after.id)} />
        <Button type="submit">Compare</Button>
      </form>
      <FieldChanges
        changes={compareEntry(entry, before.body, after.body, words)}
        none={before === after ? "This is its only revision." : "The two say the same."}
      />
    </>
  );
}
