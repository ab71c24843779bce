import "server-only";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { listCorrections } from "@/db/queries/estimate-record";
import { getRatesAt } from "@/db/queries/rates";
import { getStripTableAt } from "@/db/queries/strip-table";
import { minutesCorrections } from "@/lib/costs/estimate-record";
import { stripAnswerFor } from "@/lib/costs/strip-answer";
import type { StripAnswer, StripInput } from "@/lib/costs/strip.schema";

/**
 * What taking a deposit off costs this shop today: with its rates, its own strips and what its rework cards taught.
 * @throws InputError naming the field
 */
export function estimateStrip(db: Db, member: SignedIn, input: StripInput, now: number): StripAnswer {
  const { shopId, shop } = member;
  return stripAnswerFor(input, {
    currency: shop.currency,
    rates: getRatesAt(db, shopId, now),
    table: getStripTableAt(db, shopId, now),
    // No case is meant, so no class: the record of each method over all of them.
    corrections: minutesCorrections(listCorrections(db, shopId), null),
  });
}
