import { sql } from "drizzle-orm";
import { OUTCOMES, type Outcome } from "@/lib/cases/case-words";
import type { FixTry } from "@/lib/library/fix-record";
import type { Handle } from "../open";

/** Cases and cards that are read for a class's record, the newest first: enough for any share, whatever a shop has kept. */
export const MOST_READ = 1000;

interface Stretch {
  /** UTC milliseconds: `fromAt` belongs to it, `untilAt` no longer does. */
  fromAt: number;
  untilAt: number;
}

/** The shop's cases confirmed as this class, by when they were opened, one count a stretch. Read in the index alone. */
export function countClassIn(db: Handle, shopId: number, classSlug: string, stretches: readonly Stretch[]): number[] {
  return stretches.map(
    ({ fromAt, untilAt }) =>
      db.get<{ n: number }>(sql`
        select count(*) as n from cases
        where shop_id = ${shopId} and confirmed_class = ${classSlug}
          and opened_at >= ${fromAt} and opened_at < ${untilAt}`).n,
  );
}

/** Parts struck in the shop's runs, one sum a stretch; 0 where no run was logged. */
export function sumStruckIn(db: Handle, shopId: number, stretches: readonly Stretch[]): number[] {
  return stretches.map(
    ({ fromAt, untilAt }) =>
      db.get<{ n: number }>(sql`
        select coalesce(sum(parts_struck), 0) as n from runs
        where shop_id = ${shopId} and struck_at >= ${fromAt} and struck_at < ${untilAt}`).n,
  );
}

/** When the first case of the class, and the shop's first of any, was opened; null where there is none. */
export function getFirstOpened(
  db: Handle,
  shopId: number,
  classSlug: string,
): { ofClass: number | null; any: number | null } {
  const ofClass = db.get<{ at: number | null }>(sql`
    select min(opened_at) as at from cases where shop_id = ${shopId} and confirmed_class = ${classSlug}`).at;
  const any = db.get<{ at: number | null }>(sql`select min(opened_at) as at from cases where shop_id = ${shopId}`).at;
  return { ofClass, any };
}

interface TryRow {
  fixSlug: string;
  ref: string;
  round: number;
  outcome: string;
  spentMinutes: number | null;
}

const isOutcome = (word: string): word is Outcome => OUTCOMES.some((known) => known === word);

/**
 * Rework cards that used a fix of the library against this class and whose re-strike was looked at, newest first.
 * A card counts for the class that its own round's second look confirmed, so a round that turned into another class
 * later is not lost and not counted twice. Read are the newest 1,000 cases of the class and the newest 1,000 further
 * rounds of the shop, which hold the cases that changed their class.
 */
export function listFixTries(db: Handle, shopId: number, classSlug: string): FixTry[] {
  const rows = db.all<TryRow>(sql`
    with of_class as (
      select id from cases where shop_id = ${shopId} and confirmed_class = ${classSlug}
      order by opened_at desc, id desc limit ${MOST_READ}
    ), further as (
      select case_id as id from rework_cards where shop_id = ${shopId} and round > 1
      order by case_id desc, round desc limit ${MOST_READ}
    ), read as (select id from of_class union select id from further)
    select f.slug as fixSlug, c.ref as ref, k.round as round, k.outcome as outcome,
      (select sum(s.spent_minutes) from rework_steps s where s.shop_id = k.shop_id and s.card_id = k.id) as spentMinutes
    from read
    cross join rework_cards k on k.shop_id = ${shopId} and k.case_id = read.id and k.outcome is not null
    join library_fixes f on f.shop_id = k.shop_id and f.id = k.fix_id
    join cases c on c.shop_id = k.shop_id and c.id = k.case_id
    where exists (
      select 1 from calls l where l.shop_id = k.shop_id and l.case_id = k.case_id and l.round = k.round
        and l.kind = 'second-look' and l.class_slug = ${classSlug})
    order by k.done_at desc, k.id desc`);
  return rows.flatMap(({ outcome, ...row }) => (isOutcome(outcome) ? [{ ...row, outcome }] : []));
}
