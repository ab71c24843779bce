import type { CasebookCursor } from "@/lib/cases/casebook-cursor";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import { CASEBOOK_LIMITS, type CasebookQuery } from "@/lib/cases/casebook.schema";
import type { CappedCount } from "@/lib/cases/casebook-words";
import type { Handle } from "../open";
import { orderByTime, searchCases, type CaseSearch } from "./case-search";
import { countCasebook, listCasebook, listCasebookById, placeOf, type CasebookRow } from "./casebook";
import { listCasebookCards, listCasebookPhotos, type CasebookCard, type CasebookPair } from "./casebook-beside";

export interface CasebookPage {
  rows: CasebookRow[];
  count: CappedCount;
  photos: Map<number, CasebookPair>;
  cards: Map<number, CasebookCard>;
  next: CasebookCursor | null;
  previous: CasebookCursor | null;
  /** Null where nothing was searched for. */
  search: CaseSearch | null;
}

/**
 * One page of the casebook: a list by time, or what a search found.
 * @param asked `query` as the address says it, `filter` the same in the shop's row numbers
 * @param now UTC milliseconds
 */
export function getCasebookPage(
  db: Handle,
  shopId: number,
  asked: { query: CasebookQuery; filter: CasebookFilter },
  now: number,
): CasebookPage {
  const page = asked.query.q ? searchPage(db, shopId, asked.query.q, asked, now) : timePage(db, shopId, asked);
  const ids = page.rows.map((row) => row.id);
  return {
    ...page,
    photos: listCasebookPhotos(db, shopId, ids),
    cards: listCasebookCards(db, shopId, ids),
  };
}

type Asked = Parameters<typeof getCasebookPage>[2];
type BarePage = Omit<CasebookPage, "photos" | "cards">;

function timePage(db: Handle, shopId: number, { query, filter }: Asked): BarePage {
  const from = query.cursor && query.cursor.kind !== "match" ? query.cursor : null;
  const count = countCasebook(db, shopId, filter);
  const size = CASEBOOK_LIMITS.page;
  const order = query.order ?? "newest";
  const read = listCasebook(db, shopId, { filter, order, from, limit: size + 1, isDense: count.isCapped });
  const isBack = from?.kind === "back";
  const hasMore = read.length > size;
  // One more than a page was read, to know whether the list goes on; going back it stands in front.
  const rows = hasMore ? (isBack ? read.slice(1) : read.slice(0, size)) : read;
  const [first, last] = [rows[0], rows.at(-1)];
  return {
    rows,
    count,
    next: last && (isBack || hasMore) ? { kind: "on", ...placeOf(last, filter) } : null,
    previous: first && from && (!isBack || hasMore) ? { kind: "back", ...placeOf(first, filter) } : null,
    search: null,
  };
}

function searchPage(db: Handle, shopId: number, typed: string, { query, filter }: Asked, now: number): BarePage {
  const search = searchCases(db, shopId, typed, filter, now);
  const ids = query.order ? orderByTime(db, shopId, search.caseIds, query.order) : search.caseIds;
  const shown = query.cursor?.kind === "match" ? query.cursor.shown : 0;
  const size = CASEBOOK_LIMITS.page;
  return {
    rows: listCasebookById(db, shopId, ids.slice(shown, shown + size)),
    count: { count: ids.length, isCapped: search.isCapped },
    next: shown + size < ids.length ? { kind: "match", shown: shown + size } : null,
    previous: shown > 0 ? { kind: "match", shown: Math.max(0, shown - size) } : null,
    search,
  };
}
