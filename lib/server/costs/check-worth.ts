import type { Handle } from "@/db/open";
import { getCheckRate, getCostPerPart, type CheckSpan } from "@/db/queries/check-rate";
import { listJobMix } from "@/db/queries/job-mix";
import { openPriceBook } from "@/db/queries/price-book";
import { checkCents } from "@/lib/costs/check-cost";
import { missCost } from "@/lib/costs/miss-cost";
import { pertMean } from "@/lib/costs/pert";
import { USUAL_REWORK_TIMES } from "@/lib/costs/rework-times";
import type { TypedTestPieces } from "@/lib/costs/test-piece-words";
import { decimalText } from "@/lib/decimal";
import { centsForMinutes } from "@/lib/money";

const YEAR_MS = 365 * 86_400_000;
/** What to start from while no run had a fault. From memory. */
const USUAL_START = { badShare: 0.1, faultyRunShare: 0.05 };
const WANTED_PERCENT = "95";

/** Everything that the owner's page says about the check, from the shop's own runs, cases and rates. */
export interface CheckWorth {
  inspected: number;
  bad: number;
  runs: number;
  labourCentsPerHour: number;
  /** Null: nothing to work it out from. */
  missCents: number | null;
  missFrom: string;
  testPieces: TypedTestPieces;
  testPiecesRest: string;
}

/**
 * Is looking at every strike worth it, from the runs of a stretch of time. What cases cost is taken from the year before
 * its end: faults after the final plate are rare, and a month of them is no mean.
 */
export function getCheckWorth(db: Handle, shopId: number, span: CheckSpan, now: number): CheckWorth {
  const rate = getCheckRate(db, shopId, span);
  const own = getCostPerPart(db, shopId, { fromAt: span.toAt - YEAR_MS, toAt: span.toAt });
  const book = openPriceBook(db, shopId);
  const rates = book.ratesAt(now);
  const batch = rate.badRuns > 0 ? Math.max(1, Math.round(rate.bad / rate.badRuns)) : 1;
  const basis = { batch, rates, table: book.stripTableAt(now), minutesCorrection: book.correctionsOf(null) };
  const miss = missCost(own, "closed in the last 365 days", listJobMix(db, shopId, span), basis);
  const { labourCentsPerHour } = rates;
  return {
    inspected: rate.inspected,
    bad: rate.bad,
    runs: rate.runs,
    labourCentsPerHour,
    missCents: miss && miss.cents,
    missFrom: miss?.from ?? "",
    ...testPiecesFrom(rate, labourCentsPerHour),
  };
}

/** The test-piece fields to begin with: the shop's own figures where it has any, to one decimal. */
function testPiecesFrom(rate: ReturnType<typeof getCheckRate>, labourCentsPerHour: number) {
  const handsOn = pertMean(USUAL_REWORK_TIMES.lineToStrikeMinutesPerPart);
  const pieceCents = centsForMinutes(handsOn, labourCentsPerHour) + checkCents(labourCentsPerHour);
  const isOwn = rate.badRuns > 0;
  const badShare = isOwn ? rate.bad / rate.struckInBadRuns : USUAL_START.badShare;
  const faultyRunShare = isOwn ? rate.badRuns / rate.runs : USUAL_START.faultyRunShare;
  const spoiltRunCents = isOwn ? rate.badRunCents / rate.badRuns : 0;
  const percent = (share: number) => decimalText(Number((share * 100).toFixed(1)));
  const money = (cents: number) => (Math.round(cents) / 100).toFixed(2);
  const typed: TypedTestPieces = {
    badPercent: percent(badShare),
    wantedPercent: WANTED_PERCENT,
    pieceMoney: money(pieceCents),
    faultyRunPercent: percent(faultyRunShare),
    spoiltRunMoney: money(spoiltRunCents),
  };
  const own = isOwn
    ? `To begin with: the mean of ${rate.badRuns} of ${rate.runs} runs in which a part was held.`
    : "No run with a held part in this time: the shares to begin with are from memory.";
  const piece = `A piece: ${handsOn.toFixed(1)} min hands-on to the strike at the labour rate and one check, from memory; its metal is not in it.`;
  return { testPieces: typed, testPiecesRest: `${own} ${piece}` };
}
