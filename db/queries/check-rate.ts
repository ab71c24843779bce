import { sql } from "drizzle-orm";
import type { Handle } from "../open";

/** A stretch of time: `fromAt` belongs to it, `toAt` no longer does. UTC milliseconds. */
export interface CheckSpan {
  fromAt: number;
  toAt: number;
}

export interface CheckRate {
  runs: number;
  /** Parts struck in these runs: each is looked at, at the strike. */
  inspected: number;
  /** Parts of these runs that were held at the strike and confirmed as faulty. Never more than were struck. */
  bad: number;
  /** Runs with at least one such part, the parts struck in them, and what their cases cost. */
  badRuns: number;
  struckInBadRuns: number;
  badRunCents: number;
}

/**
 * How often the strike check finds a bad part, from the runs struck in a stretch of time. A false alarm (released) does not
 * count, nor does a confirmation that was taken back; a part that came back from rework counts once. Cases without a run
 * are left out: nobody knows out of how many they are.
 */
export function getCheckRate(db: Handle, shopId: number, { fromAt, toAt }: CheckSpan): CheckRate {
  // Runs first, by their day; their cases cannot be older, so the cases' index by time answers for them.
  return db.get<CheckRate>(sql`
    with held as (
      select c.run_id, sum(c.quantity) as parts, sum(c.cost_cents) as cents
      from cases c
      where c.shop_id = ${shopId} and c.opened_at >= ${fromAt} and c.run_id is not null and c.stage_found = 'at-strike'
        and c.confirmed_class is not null and c.confirmed_class <> 'sound'
        and not (c.state = 'held' and exists (
          select 1 from case_events e
          where e.shop_id = c.shop_id and e.case_id = c.id and e.round = c.round - 1 and e.event = 'taken-back'))
      group by c.run_id)
    select count(*) as runs,
      coalesce(sum(r.parts_struck), 0) as inspected,
      coalesce(sum(min(r.parts_struck, coalesce(held.parts, 0))), 0) as bad,
      count(held.run_id) as "badRuns",
      coalesce(sum(case when held.run_id is not null then r.parts_struck end), 0) as "struckInBadRuns",
      coalesce(sum(held.cents), 0) as "badRunCents"
    from runs r left join held on held.run_id = r.id
    where r.shop_id = ${shopId} and r.struck_at >= ${fromAt} and r.struck_at < ${toAt}`);
}

/** What the shop's closed cases cost by part, at the strike and later. */
export interface CostPerPart {
  laterCases: number;
  laterParts: number;
  laterCents: number;
  strikeCases: number;
  strikeParts: number;
  strikeCents: number;
}

/** Cases closed in a stretch of time, by whether they were found at the strike or later. False alarms are left out. */
export function getCostPerPart(db: Handle, shopId: number, { fromAt, toAt }: CheckSpan): CostPerPart {
  return db.get<CostPerPart>(sql`
    select coalesce(sum(stage_found <> 'at-strike'), 0) as "laterCases",
      coalesce(sum((stage_found <> 'at-strike') * quantity), 0) as "laterParts",
      coalesce(sum((stage_found <> 'at-strike') * cost_cents), 0) as "laterCents",
      coalesce(sum(stage_found = 'at-strike'), 0) as "strikeCases",
      coalesce(sum((stage_found = 'at-strike') * quantity), 0) as "strikeParts",
      coalesce(sum((stage_found = 'at-strike') * cost_cents), 0) as "strikeCents"
    from cases
    where shop_id = ${shopId} and closed_at >= ${fromAt} and closed_at < ${toAt} and closing <> 'released'`);
}
