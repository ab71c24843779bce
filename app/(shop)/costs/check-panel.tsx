import { CheckSection } from "@/components/costs/check-section";
import { getDb } from "@/db/client";
import type { Period } from "@/lib/costs/period";
import { getCheckWorth } from "@/lib/server/costs/check-worth";

interface CheckPanelProps {
  shopId: number;
  currency: string;
  period: Period;
  periodWords: string;
  now: number;
}

/** Is the check worth it, read after the ledger is on its way: the database answers at once or not at all. */
export async function CheckPanel({ shopId, currency, period, periodWords, now }: CheckPanelProps) {
  await new Promise(setImmediate);
  const worth = getCheckWorth(getDb(), shopId, { fromAt: period.fromAt, toAt: period.untilAt }, now);
  return <CheckSection worth={worth} periodWords={periodWords} currency={currency} />;
}
