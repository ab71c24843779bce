import { and, eq } from "drizzle-orm";
import type { Handle } from "@/db/open";
import { solutionChecks, solutionEvents, solutions } from "@/db/schema";
import { insertLine, insertSolution } from "@/db/seed/factories/insert-line";
import type { Random } from "@/db/seed/photos/random";

const DAY_MS = 86_400_000;

export interface DemoSolution {
  id: number;
  stationSlug: string;
  method: "bath" | "brush" | null;
  fromAt: number;
  /** When it was changed for the next; Infinity while it is in use. */
  untilAt: number;
  windowDays: number;
}

interface Row {
  station: string;
  code: string;
  name: string;
  windowDays: number;
  /** Days before now: made up, and retired (null: in use). */
  from: number;
  until: number | null;
  method: "bath" | "brush" | null;
}

/** Invented. Activators were let run past their window now and then: that is what the demo's cases show. */
const ROWS: Row[] = [
  { station: "clean", code: "C-7", name: "Alkaline electrocleaner", windowDays: 14, from: 34, until: 6, method: null },
  { station: "clean", code: "C-8", name: "Alkaline electrocleaner", windowDays: 14, from: 6, until: null, method: null },
  { station: "activate", code: "A-9", name: "Acid activator", windowDays: 14, from: 126, until: 88, method: "bath" },
  { station: "activate", code: "A-10", name: "Acid activator", windowDays: 14, from: 88, until: 60, method: "bath" },
  { station: "activate", code: "A-11", name: "Acid activator", windowDays: 14, from: 60, until: 19, method: "bath" },
  { station: "activate", code: "A-12", name: "Acid activator", windowDays: 14, from: 19, until: null, method: "bath" },
  { station: "activate", code: "B-4", name: "Brush activator", windowDays: 30, from: 124, until: 21, method: "brush" },
  { station: "activate", code: "B-5", name: "Brush activator", windowDays: 30, from: 21, until: null, method: "brush" },
  { station: "strike", code: "S-3", name: "Copper strike bath", windowDays: 60, from: 128, until: 40, method: "bath" },
  { station: "strike", code: "S-4", name: "Copper strike bath", windowDays: 60, from: 40, until: null, method: "bath" },
  { station: "strike", code: "SB-2", name: "Brush copper strike", windowDays: 90, from: 70, until: null, method: "brush" },
  { station: "plate", code: "N-1", name: "Nickel bath", windowDays: 90, from: 31, until: null, method: null },
]; // prettier-ignore

/** Lays the demo shop's line with four months of solutions, and a check of the strike each working morning. */
export function seedLine(
  tx: Handle,
  shop: { shopId: number; seniorId: number; now: number; random: Random },
): { stationIds: Map<string, number>; solutions: DemoSolution[] } {
  const { shopId, seniorId, now, random } = shop;
  const stationIds = insertLine(tx, shopId);
  const made = ROWS.map((row): DemoSolution => {
    const fromAt = now - row.from * DAY_MS;
    const untilAt = row.until === null ? Infinity : now - row.until * DAY_MS;
    const { station, code, name, windowDays, method } = row;
    const stationId = stationIds.get(station) ?? 0;
    const id = insertSolution(tx, {
      shopId,
      stationId,
      code,
      name,
      windowDays,
      method,
      madeUpAt: fromAt,
      memberId: seniorId,
    });
    if (untilAt !== Infinity) retire(tx, shopId, id, seniorId, untilAt);
    return { id, stationSlug: station, method, fromAt, untilAt, windowDays };
  });
  for (const strike of made.filter((each) => each.stationSlug === "strike" && each.method === "bath")) {
    logChecks(tx, shopId, seniorId, strike, now, random);
  }
  return { stationIds, solutions: made };
}

function retire(tx: Handle, shopId: number, solutionId: number, memberId: number, at: number): void {
  tx.update(solutions)
    .set({ retiredAt: at })
    .where(and(eq(solutions.shopId, shopId), eq(solutions.id, solutionId)))
    .run();
  tx.insert(solutionEvents).values({ shopId, solutionId, kind: "changed", memberId, at }).run();
}

function logChecks(
  tx: Handle,
  shopId: number,
  memberId: number,
  strike: DemoSolution,
  now: number,
  random: Random,
): void {
  for (let at = strike.fromAt + DAY_MS / 3; at < Math.min(now, strike.untilAt); at += DAY_MS) {
    const age = (at - strike.fromAt) / DAY_MS / strike.windowDays;
    tx.insert(solutionChecks)
      .values({
        shopId,
        solutionId: strike.id,
        memberId,
        at: Math.round(at),
        bathTempC: 54 + Math.round((random() - 0.5) * 4),
        volts: 0.8,
        secondsToDeposit: Math.round(20 + age * 12 + random() * 5),
      })
      .run();
  }
}

/** The solution that stood at a station at a moment, for a method. */
export function solutionAt(
  list: readonly DemoSolution[],
  station: string,
  method: "bath" | "brush",
  at: number,
): DemoSolution | null {
  return (
    list.find(
      (each) =>
        each.stationSlug === station &&
        each.fromAt <= at &&
        at < each.untilAt &&
        (each.method === null || each.method === method),
    ) ?? null
  );
}
