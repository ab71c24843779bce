import "server-only";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import type { CasebookRow } from "@/db/queries/casebook";
import { listCasebookChoices } from "@/db/queries/casebook-beside";
import { getCasebookPage } from "@/db/queries/casebook-page";
import { writeCasebookCursor } from "@/lib/cases/casebook-cursor";
import { resolveFilter } from "@/lib/cases/casebook-filter";
import type { CasebookQuery, FilterName } from "@/lib/cases/casebook.schema";
import { fault } from "@/lib/fault";
import { can } from "@/lib/permissions";

/**
 * A page of the casebook for a program to read.
 * @throws FaultError "invalid" naming each filter that asks for something this shop does not have
 */
export function listCasesFor(db: Db, member: SignedIn, query: CasebookQuery, now: number) {
  const { filter, unknown } = resolveFilter(query, listCasebookChoices(db, member.shopId), member.shop.timeZone);
  if (unknown.length > 0) {
    const fields = Object.fromEntries(unknown.map((name) => [name, `This shop has no such ${nameOf(name)}.`]));
    throw fault("invalid", `Nothing was listed. This shop has no such ${unknown.map(nameOf).join(", ")}.`, fields);
  }
  const page = getCasebookPage(db, member.shopId, { query, filter }, now);
  const withMoney = can(member, "money.case");
  return {
    cases: page.rows.map((row) => caseForProgram(row, withMoney)),
    count: page.count.count,
    isMore: page.count.isCapped,
    nextCursor: page.next && writeCasebookCursor(page.next),
  };
}

const nameOf = (filter: FilterName) => (filter === "by" ? "member" : filter);

function caseForProgram({ id: _id, costCents, costBasis, ...row }: CasebookRow, withMoney: boolean) {
  const { classSlug, classTitle, ...rest } = row;
  return {
    ...rest,
    class: classSlug,
    classTitle,
    isConfirmed: row.state !== "held",
    ...(withMoney ? { costCents, costBasis } : {}),
  };
}
