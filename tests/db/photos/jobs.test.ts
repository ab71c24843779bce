import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import {
  claimNextJob,
  countJobs,
  failJob,
  finishJob,
  postponeJob,
  pruneDoneJobs,
  requeueRunningJobs,
} from "@/db/queries/jobs";
import { enqueue } from "@/lib/server/jobs";
import { insertShop, TEST_NOW as NOW } from "@/tests/fixtures/crew-factory";
import { emptyDatabase } from "@/tests/fixtures/shop-factory";

let db: Db;
let shopId: number;

beforeEach(() => {
  db = emptyDatabase();
  shopId = insertShop(db);
});

const add = (n: number, more: { runAfterAt?: number; onceKey?: string } = {}) =>
  enqueue(db, { shopId, kind: "send-mail", payload: { n }, now: NOW, ...more });
const next = (now = NOW) => claimNextJob(db, now)?.payload.n;

describe("jobs", () => {
  it("are taken in the order in which they fall due, each by one worker", () => {
    add(1, { runAfterAt: NOW + 50 });
    add(2);
    add(3);
    expect([next(), next(), next()]).toEqual([2, 3, undefined]);
    expect([next(NOW + 50), next(NOW + 50)]).toEqual([1, undefined]);
  });

  it("with one key are one job while the first waits, and another once it has begun", () => {
    add(1, { onceKey: "digest" });
    add(2, { onceKey: "digest" });
    expect([next(), next()]).toEqual([1, undefined]);
    add(3, { onceKey: "digest" });
    expect(next()).toBe(3);
  });

  it("that a killed process left in the middle wait again, and it is not counted against them", () => {
    add(1);
    next();
    expect(countJobs(db)).toEqual({ waiting: 0, running: 1, failed: 0 });
    expect(requeueRunningJobs(db)).toBe(1);
    expect(claimNextJob(db, NOW)).toMatchObject({ payload: { n: 1 }, attempts: 0 });
  });

  it("that failed wait for their next try", () => {
    add(1);
    const job = claimNextJob(db, NOW);
    postponeJob(db, job?.id ?? 0, NOW + 10, "no answer");
    expect(next(NOW + 9)).toBeUndefined();
    expect(claimNextJob(db, NOW + 10)).toMatchObject({ attempts: 1 });
  });

  it("that are done are kept for a while, those that failed for good stay to be looked at", () => {
    for (const n of [1, 2]) add(n);
    finishJob(db, claimNextJob(db, NOW)?.id ?? 0, NOW);
    failJob(db, claimNextJob(db, NOW)?.id ?? 0, NOW, "broken");
    expect(pruneDoneJobs(db, NOW)).toBe(0);
    expect(pruneDoneJobs(db, NOW + 1)).toBe(1);
    expect(countJobs(db)).toEqual({ waiting: 0, running: 0, failed: 1 });
  });
});
