import { routes } from "@/lib/routes";
import type { LedgerGroup, LedgerQuery } from "./ledger.schema";

/** Which of the casebook's filters a ledger bar sets. */
export const LEDGER_FILTER: Record<LedgerGroup, string> = {
  cause: "cause",
  class: "class",
  station: "station",
  "base-metal": "metal",
  customer: "customer",
};

/** The ledger as it is shown, with some of it changed. What stands at its default is left out of the address. */
export function ledgerHref(query: LedgerQuery, change: Partial<LedgerQuery>): string {
  const next = { ...query, ...change };
  return routes.ledger({
    ...(next.by === "cause" ? {} : { by: next.by }),
    ...(next.span === "month" ? {} : { span: next.span }),
    ...(next.from && next.to ? { from: next.from, to: next.to } : {}),
    ...(next.station ? { station: next.station } : {}),
  });
}
