/** One case's words for the comparison, in the order of its rows. */
export interface FactCell {
  label: string;
  value: string;
}

/** A fact of all compared cases. */
export interface FactRow {
  label: string;
  /** One a case, in their order. */
  values: readonly string[];
  isSame: boolean;
}

const NONE = "Not known";

/**
 * Facts of cases set side by side, each row with whether all of them share it. A fact that one case lacks differs; one
 * that none has is left out.
 */
export function compareFacts(columns: readonly (readonly FactCell[])[]): FactRow[] {
  const labels = [...new Set(columns.flatMap((cells) => cells.map((cell) => cell.label)))];
  return labels.flatMap((label) => {
    const values = columns.map((cells) => cells.find((cell) => cell.label === label)?.value || NONE);
    if (values.every((value) => value === NONE)) return [];
    return [{ label, values, isSame: values.every((value) => value === values[0]) }];
  });
}

/** "They differ in class, cause and base metal.": what to look at, in a sentence. */
export function differWords(rows: readonly FactRow[]): string {
  const names = rows.filter((row) => !row.isSame).map((row) => row.label.toLowerCase());
  if (names.length === 0) return "They share every fact that was written down.";
  const last = names.at(-1) ?? "";
  const list = names.length === 1 ? last : `${names.slice(0, -1).join(", ")} and ${last}`;
  return `They differ in ${list}.`;
}
