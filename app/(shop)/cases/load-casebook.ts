import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { countCasebook } from "@/db/queries/casebook";
import { listCasebookChoices } from "@/db/queries/casebook-beside";
import { isByClosing } from "@/db/queries/casebook-conditions";
import { getCasebookPage } from "@/db/queries/casebook-page";
import { filtersSet } from "@/lib/cases/casebook-address";
import { resolveFilter } from "@/lib/cases/casebook-filter";
import { casebookItem } from "@/lib/cases/casebook-item";
import type { CasebookQuery } from "@/lib/cases/casebook.schema";
import { formatMoney } from "@/lib/money";
import { can } from "@/lib/permissions";

export type LoadedCasebook = ReturnType<typeof loadCasebook>;

/** All that the casebook's page shows to this member. Money is only in it where they may see it. */
export function loadCasebook(member: SignedIn, asked: CasebookQuery, now: number) {
  const db = getDb();
  const { shopId } = member;
  const { timeZone, currency } = member.shop;
  const choices = listCasebookChoices(db, shopId);
  const { filter, names, unknown } = resolveFilter(asked, choices, timeZone);
  // What the shop does not have is left out and said, so that a link from before a change still shows something.
  const query: CasebookQuery = { ...asked, ...Object.fromEntries(unknown.map((name) => [name, undefined])) };
  const filters = filtersSet(query);
  const page = getCasebookPage(db, shopId, { query, filter }, now);
  const withMoney = can(member, "money.case");
  const terms = page.search?.terms ?? [];
  const view = { now, timeZone, terms, money: withMoney ? (cents: number) => formatMoney(cents, currency) : null };
  const items = page.rows.map((row) =>
    casebookItem(
      row,
      { pair: page.photos.get(row.id), card: page.cards.get(row.id), text: page.search?.texts.get(row.id) },
      view,
    ),
  );
  return {
    query,
    names,
    unknown,
    filters,
    choices,
    items,
    terms,
    withMoney,
    search: page.search,
    count: page.count,
    all: filters.length > 0 ? countCasebook(db, shopId, {}) : page.count,
    next: page.next,
    previous: page.previous,
    time: {
      column: isByClosing(filter) && !page.search ? ("closed" as const) : ("opened" as const),
      sorted: sortedBy(query, page.search !== null),
    },
  };
}

/** A search stands by likeness until somebody asks for time. */
function sortedBy(query: CasebookQuery, isSearch: boolean): "ascending" | "descending" | undefined {
  if (query.order === "oldest") return "ascending";
  return query.order === "newest" || !isSearch ? "descending" : undefined;
}
