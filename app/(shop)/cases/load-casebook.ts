import type { TrayCase } from "@/components/cases/beside-tray";
import { getDb } from "@/db/client";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { countCasebook, listCasebookById, listIdsByRef } from "@/db/queries/casebook";
import { listCasebookChoices, listCasebookPhotos } from "@/db/queries/casebook-beside";
import { isByClosing } from "@/db/queries/casebook-conditions";
import { getCasebookPage } from "@/db/queries/casebook-page";
import { listSavedSearches } from "@/db/queries/saved-searches";
import { casebookAddress, filtersSet } from "@/lib/cases/casebook-address";
import { resolveFilter } from "@/lib/cases/casebook-filter";
import { casebookItem, type CasebookItem } from "@/lib/cases/casebook-item";
import type { CasebookQuery } from "@/lib/cases/casebook.schema";
import { formatMoney } from "@/lib/money";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";

export type LoadedCasebook = ReturnType<typeof loadCasebook>;

/** All that the casebook's page shows to this member. Money is only in it where they may see it. */
export function loadCasebook(member: SignedIn, asked: CasebookQuery, refs: readonly string[], now: number) {
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
  const address = new URLSearchParams(casebookAddress(query)).toString();
  const saved = listSavedSearches(db, member).map(({ id, name, query: kept }) => ({
    id,
    name,
    href: `${routes.casebook()}?${kept}`,
    isShown: kept === address,
  }));
  return {
    query,
    saved,
    /** The address to keep; null where nothing is narrowed, or where it is kept already. */
    keepable: filters.length > 0 && !saved.some((each) => each.isShown) ? address : null,
    tray: listTray(db, shopId, refs, view),
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

/** The picked cases, in the order of picking; references that the shop does not have are left out. */
function listTray(
  db: Db,
  shopId: number,
  refs: readonly string[],
  view: Parameters<typeof casebookItem>[2],
): TrayCase[] {
  const rows = listCasebookById(db, shopId, listIdsByRef(db, shopId, refs));
  const photos = listCasebookPhotos(
    db,
    shopId,
    rows.map((row) => row.id),
  );
  return rows.map((row) => trayCase(casebookItem(row, { pair: photos.get(row.id) }, view)));
}

/** A case as it lies in the tray. */
export function trayCase({ ref, classWords, before }: CasebookItem): TrayCase {
  return { ref, classWords, photoId: before?.id ?? null };
}

/** A search stands by likeness until somebody asks for time. */
function sortedBy(query: CasebookQuery, isSearch: boolean): "ascending" | "descending" | undefined {
  if (query.order === "oldest") return "ascending";
  return query.order === "newest" || !isSearch ? "descending" : undefined;
}
