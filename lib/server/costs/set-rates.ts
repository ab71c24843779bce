import type { Db, Handle } from "@/db/open";
import { insertAudit } from "@/db/queries/audit";
import type { SignedIn } from "@/db/queries/crew";
import { getRatesAt, insertRatesRow, listMetalsInUse } from "@/db/queries/rates";
import { dayWords } from "@/lib/cases/moment-words";
import { dayOf, dayStart } from "@/lib/costs/period";
import { priceFieldName, rateChanges } from "@/lib/costs/rate-fields";
import type { RatesInput } from "@/lib/costs/rates.schema";
import { fault } from "@/lib/fault";
import { metalOf } from "@/lib/plating/metals";

/** What was set, in words. */
export interface SetRates {
  from: string;
  changed: number;
}

/**
 * Adds the shop's rates from a day on. Earlier rows stay as they are; a mistake is corrected by a later row.
 * @throws FaultError "invalid" for a day that has passed or a metal in use without a price, "conflict" when nothing changes
 */
export function setRates(db: Db, owner: SignedIn, input: RatesInput, now: number): SetRates {
  const { shopId, memberId } = owner;
  const { timeZone, currency } = owner.shop;
  const validFromAt = startOf(input.validFrom, now, timeZone);
  const { figures, source } = input;
  const from = dayWords(validFromAt, timeZone);
  return db.transaction(
    (tx) => {
      demandPrices(tx, shopId, input);
      const before = getRatesAt(tx, shopId, validFromAt);
      const changes = rateChanges(before, figures, currency);
      if (changes.length === 0 && before.source === source) {
        throw fault("conflict", `These rates hold on ${from} already. Change one, or say another source.`);
      }
      insertRatesRow(tx, { shopId, memberId, validFromAt, rates: { ...figures, source }, now });
      const changed = changes.map((change) => `${change.label} ${change.from} to ${change.to}`);
      const detail = { ...(changed.length > 0 ? { changed } : {}), source };
      insertAudit(tx, { shopId, memberId, action: "rates.set", subject: `from ${from}`, detail, now });
      return { from, changed: changes.length };
    },
    { behavior: "immediate" },
  );
}

/** A row may not reach back: a case keeps the rates of its day. */
function startOf(day: string, now: number, timeZone: string): number {
  const startAt = dayStart(day, timeZone, "validFrom");
  if (startAt >= dayStart(dayOf(now, timeZone), timeZone)) return startAt;
  const words = "That day has passed, and its cases keep their rates. Choose today or a later day.";
  throw fault("invalid", words, { validFrom: words });
}

function demandPrices(tx: Handle, shopId: number, { figures }: RatesInput): void {
  const missing = listMetalsInUse(tx, shopId).filter((metal) => figures.metalCentsPerG[metal] === undefined);
  if (missing.length === 0) return;
  const fields = missing.map((metal) => [
    priceFieldName(metal),
    `Give the price of ${metalOf(metal).name}: jobs here are plated with it.`,
  ]);
  throw fault("invalid", "A metal in use has no price.", Object.fromEntries(fields));
}
