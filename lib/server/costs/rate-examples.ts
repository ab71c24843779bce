import type { Handle } from "@/db/open";
import { getCheckRate } from "@/db/queries/check-rate";
import { listJobMix, type StruckJob } from "@/db/queries/job-mix";
import { openPriceBook, type PriceBook } from "@/db/queries/price-book";
import { getDearestLaterCase, listExampleCases, type ExampleCase } from "@/db/queries/rate-examples";
import { STAGE_TITLES } from "@/lib/cases/case-words";
import { methodRefusal } from "@/lib/costs/method-refusal";
import type { NamedExample, RatesBench } from "@/lib/costs/rates-bench";
import type { StripTable } from "@/lib/costs/strip-plan";

const DAY_MS = 86_400_000;
/** What counts as recent for the dearest case, and for what a shop usually strikes. */
const DEAREST_DAYS = 365;
const USUAL_DAYS = 91;

/** Reworks of the shop to try rates on, with the table and the corrections that they would be priced with today. */
export function getRatesBench(db: Handle, shopId: number, now: number): RatesBench {
  const book = openPriceBook(db, shopId);
  const table = book.stripTableAt(now);
  const span = { fromAt: now - USUAL_DAYS * DAY_MS, toAt: now };
  const rate = getCheckRate(db, shopId, span);
  const batch = rate.badRuns > 0 ? Math.max(1, Math.round(rate.bad / rate.badRuns)) : 1;
  const usual = listJobMix(db, shopId, span)[0];
  const dearest = getDearestLaterCase(db, shopId, now - DEAREST_DAYS * DAY_MS);
  const examples = [
    ...(dearest ? [fromCase(dearest, book, table, "dearest")] : []),
    ...(usual ? [fromJob(usual, batch, book)] : []),
    ...listExampleCases(db, shopId).map((each) => fromCase(each, book, table, "case")),
  ];
  const metals = new Set(examples.flatMap(({ stack }) => stack.map(({ metal }) => metal)));
  return {
    examples,
    // Only what these examples can need: the page carries it to the browser.
    table: { ...table, dissolving: table.dissolving.filter((row) => row.takesOff.some((metal) => metals.has(metal))) },
    shopShare: rate.inspected > 0 ? rate.bad / rate.inspected : null,
  };
}

function fromCase(
  { ref, partName, classSlug, method, ...facts }: ExampleCase,
  book: PriceBook,
  table: StripTable,
  kind: NamedExample["kind"],
): NamedExample {
  const stageFound = facts.stageFound === "at-strike" ? "after-final-plate" : facts.stageFound;
  const isSafe = method !== null && methodRefusal({ ...facts, stageFound, table }, method) === null;
  return {
    ...facts,
    id: `${kind}-${ref}`,
    kind,
    ref,
    title: `${facts.quantity} × ${partName}`,
    note: STAGE_TITLES[facts.stageFound].toLowerCase(),
    method: isSafe ? method : null,
    minutesCorrection: book.correctionsOf(classSlug),
  };
}

function fromJob(job: StruckJob, batch: number, book: PriceBook): NamedExample {
  const { workOrderId, number, partName, parts: _struck, ...facts } = job;
  return {
    ...facts,
    id: `job-${workOrderId}`,
    kind: "usual",
    ref: null,
    title: `${batch} × ${partName}`,
    note: `${number}, most struck in ${USUAL_DAYS} days`,
    quantity: batch,
    stageFound: "after-final-plate",
    method: null,
    minutesCorrection: book.correctionsOf(null),
  };
}
