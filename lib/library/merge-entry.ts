import type { EntryField, FieldForm } from "./entry-fields";
import type { DraftBody } from "./entry-kinds";
import { sameValue } from "./same-value";

/** Who changed a field since both began: nobody, one of the two, both alike, or both in their own way. */
export type FieldStanding = "same" | "mine" | "theirs" | "alike" | "clash";

/** A field as the two editors left it. */
export interface FieldMerge {
  field: EntryField;
  standing: FieldStanding;
  /** What both began from; undefined where it is not known. */
  base: unknown;
  mine: unknown;
  theirs: unknown;
  /** Mine and theirs, one after the other; undefined where a field has room for one only. */
  both: unknown;
}

export const MERGE_CHOICES = ["mine", "theirs", "both"] as const;
export type MergeChoice = (typeof MERGE_CHOICES)[number];

/**
 * Sets two editors' words side by side, field by field. What only one of them changed needs no choice; where both did, and
 * not alike, somebody has to choose. Without a base every difference is a clash.
 * @param base what both began from, or null
 * @param mine what was typed
 * @param theirs what was published meanwhile
 */
export function mergeEntry(
  fields: readonly EntryField[],
  base: DraftBody | null,
  mine: DraftBody,
  theirs: DraftBody,
): FieldMerge[] {
  return fields.map((field) => {
    const { name } = field;
    const sides = { base: base?.[name], mine: mine[name], theirs: theirs[name] };
    return {
      field,
      ...sides,
      standing: standingOf(base !== null, sides),
      both: bothOf(field.form, sides.mine, sides.theirs),
    };
  });
}

interface Sides {
  base: unknown;
  mine: unknown;
  theirs: unknown;
}

function standingOf(hasBase: boolean, { base, mine, theirs }: Sides): FieldStanding {
  const isAlike = sameValue(mine, theirs);
  if (!hasBase) return isAlike ? "same" : "clash";
  const mineMoved = !sameValue(mine, base);
  const theirsMoved = !sameValue(theirs, base);
  if (mineMoved && theirsMoved) return isAlike ? "alike" : "clash";
  if (mineMoved) return "mine";
  return theirsMoved ? "theirs" : "same";
}

/** Theirs, then what mine has besides: no item and no word of either is left out. */
function bothOf(form: FieldForm, mine: unknown, theirs: unknown): unknown {
  if (Array.isArray(mine) && Array.isArray(theirs)) {
    return [...theirs, ...mine.filter((item) => !theirs.some((other) => sameValue(item, other)))];
  }
  if (typeof mine !== "string" || typeof theirs !== "string") return undefined;
  if (form === "text") return `${theirs}\n\n${mine}`;
  return form === "line" ? `${theirs}; ${mine}` : undefined;
}

export type SettledMerge = { settled: true; body: DraftBody } | { settled: false; open: string[] };

/**
 * The entry that comes of a merge.
 * @param choices by field name, for the fields that clash; one that a field has no room for counts as none
 * @returns the merged fields, or the names of the fields that still want a choice
 */
export function settleMerge(
  merges: readonly FieldMerge[],
  choices: Readonly<Record<string, MergeChoice>>,
): SettledMerge {
  const body: DraftBody = {};
  const open: string[] = [];
  for (const merge of merges) {
    const { name } = merge.field;
    const choice = merge.standing === "clash" ? choices[name] : merge.standing === "theirs" ? "theirs" : "mine";
    if (choice === undefined || (choice === "both" && merge.both === undefined)) open.push(name);
    else body[name] = merge[choice];
  }
  return open.length > 0 ? { settled: false, open } : { settled: true, body };
}
