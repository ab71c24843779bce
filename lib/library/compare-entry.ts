import { ENTRY_FIELDS, fieldText, type EntryField, type NameWords } from "./entry-fields";
import type { DraftBody, ShelfKind } from "./entry-kinds";
import { sameValue } from "./same-value";
import { wordDiff, type DiffPart } from "./word-diff";

/** A field that differs between two revisions, word by word. */
export interface FieldChange {
  name: string;
  label: string;
  parts: DiffPart[];
}

/** The fields in which two revisions of an entry differ, in the order of the form; none where they say the same. */
export function compareEntry(kind: ShelfKind, before: DraftBody, after: DraftBody, words?: NameWords): FieldChange[] {
  return changedFields(kind, before, after).map((field) => ({
    name: field.name,
    label: field.label,
    parts: wordDiff(fieldText(field, before[field.name], words), fieldText(field, after[field.name], words)),
  }));
}

/** The same without the words: which fields differ. */
export function changedFields(kind: ShelfKind, before: DraftBody, after: DraftBody): EntryField[] {
  return ENTRY_FIELDS[kind].filter(({ name }) => !sameValue(before[name], after[name]));
}
