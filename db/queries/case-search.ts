import Fuse, { type IFuseOptions } from "fuse.js";
import { and, desc, eq, sql } from "drizzle-orm";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";
import {
  hasDigit,
  matchExpression,
  runningNumberExpression,
  typedWords,
  type SearchTerm,
} from "@/lib/cases/search-query";
import { readTypedRef } from "@/lib/cases/typed-ref";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";
import { cases } from "../schema";
import { readSearchWords } from "./case-words";
import { filterConditions, filterShape } from "./casebook-conditions";

/** The words by which a case is found, as the index holds them. */
export interface CaseText {
  ref: string;
  job: string;
  class: string;
  cause: string;
  notes: string;
}

export interface CaseSearch {
  /** Cases that answer, best first. */
  caseIds: number[];
  /** The words of those that answered by their words. */
  texts: Map<number, CaseText>;
  /** How each word was read. */
  terms: SearchTerm[];
  /** No case holds all the words: these hold some. */
  isLoose: boolean;
  /** There are more that answer, but none better. */
  isCapped: boolean;
}

export const MOST_MATCHES = 200;
/** A running number comes round every month; the newest few are meant. */
const MOST_NUMBERED = 5;

/** How much a word counts by where it stands: scope, ref, job, class, cause, notes. Found by trying on the demo cases. */
const BY_PLACE = "bm25(0, 6, 2, 3, 2, 1)";

const FUSE_OPTIONS: IFuseOptions<CaseText> = {
  useTokenSearch: true,
  ignoreLocation: true,
  includeScore: true,
  // The words are mended already, so only close ones count.
  threshold: 0.1,
  keys: [
    { name: "job", weight: 2 },
    { name: "class", weight: 3 },
    { name: "cause", weight: 2 },
    { name: "notes", weight: 1 },
  ],
};

/**
 * Finds the shop's cases by what somebody typed: a reference in any usual form, or words, misspelt or in any order.
 * @param filter narrows what can be found
 * @param now UTC milliseconds, for how long the vocabulary is kept
 */
export function searchCases(
  db: Handle,
  shopId: number,
  typed: string,
  filter: CasebookFilter,
  now: number,
): CaseSearch {
  const ref = readTypedRef(typed);
  const named = ref && "ref" in ref ? listByRef(db, shopId, ref.ref, filter) : [];
  if (named.length > 0) return { caseIds: named, texts: new Map(), terms: [], isLoose: false, isCapped: false };
  const numbered = ref && "runningNumber" in ref ? listByNumber(db, shopId, ref.runningNumber, filter) : [];
  // A reference that the shop does not have may be a job number: its figures are looked for, without the "CT".
  const words = typedWords(typed).filter((word) => !ref || hasDigit(word));
  const terms = readSearchWords(db, shopId, words, now);
  const all = terms.length > 0 ? listMatches(db, shopId, matchExpression(shopId, terms, "all"), filter) : [];
  const isLoose = all.length === 0 && terms.length > 1;
  const found = isLoose ? listMatches(db, shopId, matchExpression(shopId, terms, "any"), filter) : all;
  const ranked = rankByLikeness(found, terms);
  return {
    caseIds: [...new Set([...numbered, ...ranked.map((match) => match.caseId)])],
    texts: new Map(found.map(({ caseId, ...text }) => [caseId, text])),
    terms,
    isLoose,
    isCapped: found.length === MOST_MATCHES,
  };
}

interface Match extends CaseText {
  caseId: number;
}

/** Orders the index's candidates anew by how alike they are to the whole of what was asked. None is lost. */
function rankByLikeness(found: readonly Match[], terms: readonly SearchTerm[]): Match[] {
  if (found.length < 2) return [...found];
  const asked = terms.map(({ typed, readAs }) => readAs[0] ?? typed).join(" ");
  const alike = new Fuse(found, FUSE_OPTIONS).search(asked).map((result) => result.item);
  return [...new Set([...alike, ...found])];
}

const shopId$ = sql.placeholder("shopId");
const isMatch = sql`case_search match ${sql.placeholder("expression")}`;
const matchColumns = {
  caseId: sql<number>`case_search.rowid`,
  ref: sql<string>`case_search.ref`,
  job: sql<string>`case_search.job`,
  class: sql<string>`case_search.class`,
  cause: sql<string>`case_search.cause`,
  notes: sql<string>`case_search.notes`,
};

function listMatches(db: Handle, shopId: number, expression: string, filter: CasebookFilter): Match[] {
  const shape = filterShape(filter);
  const query = preparedOnce(db, `case search ${shape}`, () => {
    const all = db.select(matchColumns).from(sql`case_search`);
    // The words lead: with an ordinary join SQLite may begin with the filter and ask the index once for each case.
    const isAmong = and(eq(cases.id, sql`case_search.rowid`), filterConditions(db, filter, "nothing"));
    const among = shape === "" ? all : all.crossJoin(cases);
    return among
      .where(and(isMatch, sql.raw(`rank match '${BY_PLACE}'`), shape === "" ? undefined : isAmong))
      .orderBy(sql`rank`)
      .limit(MOST_MATCHES)
      .prepare();
  });
  return query.all({ ...filter, shopId, expression });
}

function listByRef(db: Handle, shopId: number, ref: string, filter: CasebookFilter): number[] {
  const query = preparedOnce(db, `case by ref ${filterShape(filter)}`, () =>
    db
      .select({ id: cases.id })
      .from(cases)
      .where(and(filterConditions(db, filter, "all"), eq(cases.ref, sql.placeholder("ref"))))
      .prepare(),
  );
  return query.all({ ...filter, shopId, ref }).map((row) => row.id);
}

function listByNumber(db: Handle, shopId: number, runningNumber: string, filter: CasebookFilter): number[] {
  const query = preparedOnce(db, `case by number ${filterShape(filter)}`, () =>
    db
      .select({ id: cases.id })
      .from(sql`case_search`)
      .crossJoin(cases)
      .where(and(isMatch, eq(cases.id, sql`case_search.rowid`), filterConditions(db, filter, "nothing")))
      .orderBy(desc(sql`case_search.rowid`))
      .limit(MOST_NUMBERED)
      .prepare(),
  );
  return query
    .all({ ...filter, shopId, expression: runningNumberExpression(shopId, runningNumber) })
    .map((row) => row.id);
}

/** These cases by when they were opened. */
export function orderByTime(
  db: Handle,
  shopId: number,
  caseIds: readonly number[],
  order: "newest" | "oldest",
): number[] {
  const query = preparedOnce(db, `cases by time ${order}`, () =>
    db
      .select({ id: cases.id })
      .from(cases)
      .where(
        and(eq(cases.shopId, shopId$), sql`${cases.id} in (select value from json_each(${sql.placeholder("ids")}))`),
      )
      .orderBy(...(order === "newest" ? [desc(cases.openedAt), desc(cases.id)] : [cases.openedAt, cases.id]))
      .prepare(),
  );
  return query.all({ shopId, ids: JSON.stringify(caseIds) }).map((row) => row.id);
}
