import { useState } from "react";
import { rowNumbers, type FormValues } from "@/lib/library/entry-form";

/** A row of a table in a form: what it holds at first, whatever number it has by now. */
export interface FormRow {
  id: number;
  values: FormValues;
}

/** Without scripts nothing adds a row, so that many blank ones stand ready. */
const BLANK_ROWS = 1;

/** The rows of a table: begun from the form's values, then added, moved and taken out. */
export function useRows(table: string, values: FormValues) {
  const [rows, setRows] = useState<FormRow[]>(() => {
    const filled = rowNumbers(values, table).map((number, id) => ({ id, values: rowOf(values, table, number) }));
    const blank = Array.from({ length: BLANK_ROWS }, (_, index) => ({ id: filled.length + index, values: {} }));
    return [...filled, ...blank];
  });
  return {
    rows,
    add: () => setRows((all) => [...all, { id: Math.max(-1, ...all.map((row) => row.id)) + 1, values: {} }]),
    remove: (id: number) => setRows((all) => all.filter((row) => row.id !== id)),
    /** One place up; the first stays. */
    raise: (id: number) =>
      setRows((all) => {
        const at = all.findIndex((row) => row.id === id);
        const row = all[at];
        const above = all[at - 1];
        return row && above ? [...all.slice(0, at - 1), row, above, ...all.slice(at + 1)] : all;
      }),
  };
}

function rowOf(values: FormValues, table: string, number: number): FormValues {
  const start = `${table}.${number}.`;
  return Object.fromEntries(
    Object.entries(values).flatMap(([name, value]) =>
      name.startsWith(start) ? [[name.slice(start.length), value] as const] : [],
    ),
  );
}
