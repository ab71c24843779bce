import { listCostBy } from "@/db/queries/ledger";
import { getStation } from "@/db/queries/line";
import { ledgerSchema } from "@/lib/costs/ledger.schema";
import { ledgerRows } from "@/lib/costs/ledger-view";
import { lastSpan, periodOf } from "@/lib/costs/period";
import { fault } from "@/lib/fault";
import { handle } from "@/lib/server/handle";

/** What rework cost, added up by one thing. Money in cents of the shop's currency. */
export const GET = handle({
  permission: "ledger.see",
  input: ledgerSchema,
  run: ({ member, db, now, input }) => {
    const { timeZone, currency } = member.shop;
    const period =
      input.from && input.to ? periodOf(input.from, input.to, timeZone) : lastSpan(input.span, now, timeZone);
    const station = input.station ? getStation(db, member.shopId, input.station) : null;
    if (input.station && !station) {
      throw fault("invalid", "That station is not on this shop's line.", {
        station: "Use a station of this shop's line.",
      });
    }
    const scope = { fromAt: period.fromAt, untilAt: period.untilAt, stationId: station?.id ?? null };
    const { rows, totalCents } = ledgerRows(listCostBy(db, member.shopId, input.by, scope));
    return { rows, total: totalCents, currency, given: { from: period.from, to: period.to, by: input.by } };
  },
});
