import { writeCasebookCursor } from "./casebook-cursor";
import { casebookSchema, FILTER_NAMES, type CasebookQuery, type FilterName } from "./casebook.schema";

type Params = Record<string, string | string[] | undefined>;

/**
 * Reads the casebook's address. What it cannot use is left out and named, so that the page can say so: a link that
 * somebody cut short still opens.
 * @returns `isTidy` is false where the address holds empty fields, as a form without script sends them
 */
export function readCasebookAddress(params: Params): { query: CasebookQuery; left: string[]; isTidy: boolean } {
  const given: Record<string, string> = {};
  for (const [name, value] of Object.entries(params)) {
    const first = Array.isArray(value) ? value[0] : value;
    if (first !== undefined && name in casebookSchema.shape) given[name] = first;
  }
  const isTidy = !Object.values(given).includes("");
  const left: string[] = [];
  for (;;) {
    const read = casebookSchema.safeParse(given);
    if (read.success) return { query: read.data, left, isTidy };
    const wrong = new Set(read.error.issues.map((issue) => String(issue.path[0])));
    for (const name of wrong) delete given[name];
    left.push(...[...wrong].filter((name) => name !== "cursor"));
  }
}

/** What an address holds besides its filters. */
type Extra = "order" | "view" | "cursor";

/**
 * The fields of an address that asks for this. A changed filter begins at the first page, so a cursor is only kept
 * where it is named in `change`; null takes a field out.
 * @example casebookAddress({ class: "peeling", metal: "brass" }, { metal: null }) // { class: "peeling" }
 */
export function casebookAddress(
  query: CasebookQuery,
  change: { [Name in FilterName | Extra]?: CasebookQuery[Name] | null } = {},
): Record<string, string> {
  const next: Record<string, unknown> = { ...query, cursor: undefined, ...change };
  const address: Record<string, string> = {};
  for (const name of [...FILTER_NAMES, "order", "view"]) {
    const value = next[name];
    if (typeof value === "string" || typeof value === "number") address[name] = String(value);
  }
  if (address.view === "grid") delete address.view;
  if (change.cursor) address.cursor = writeCasebookCursor(change.cursor);
  return address;
}

/** The filters that this query sets. */
export function filtersSet(query: CasebookQuery): FilterName[] {
  return FILTER_NAMES.filter((name) => query[name] !== undefined);
}
