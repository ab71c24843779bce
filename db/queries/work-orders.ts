import { and, asc, count, desc, eq, isNotNull, isNull, sql } from "drizzle-orm";
import type { JobCursor } from "@/lib/cases/job-cursor";
import type { Handle } from "../open";
import { cases, customers, workOrders } from "../schema";

const heldCases = sql<number>`(select count(*) from ${cases} where ${cases.shopId} = ${workOrders.shopId}
  and ${cases.workOrderId} = ${workOrders.id} and ${cases.state} = 'held')`;

const columns = {
  id: workOrders.id,
  number: workOrders.number,
  customer: customers.name,
  partName: workOrders.partName,
  baseMetal: workOrders.baseMetal,
  alloy: workOrders.alloy,
  quantity: workOrders.quantity,
  areaDm2: workOrders.areaDm2,
  /** 0: nobody has filled it in. For those who may see money: the caller asks `can(member, "money.case")`. */
  partValueCents: workOrders.partValueCents,
  finalStack: workOrders.finalStack,
  openedAt: workOrders.openedAt,
  closedAt: workOrders.closedAt,
  heldCases,
};

const rowsOf = (db: Handle) =>
  db
    .select(columns)
    .from(workOrders)
    .innerJoin(customers, and(eq(customers.shopId, workOrders.shopId), eq(customers.id, workOrders.customerId)));

export type JobRow = NonNullable<ReturnType<typeof getJob>>;

/** Open jobs, the last opened first; or closed ones, the last closed first. */
export function listJobs(
  db: Handle,
  shopId: number,
  page: { closed: boolean; after?: JobCursor; limit: number },
): JobRow[] {
  const { closed, after, limit } = page;
  const at = closed ? workOrders.closedAt : workOrders.openedAt;
  return rowsOf(db)
    .where(
      and(
        eq(workOrders.shopId, shopId),
        closed ? isNotNull(workOrders.closedAt) : isNull(workOrders.closedAt),
        after ? sql`(${at}, ${workOrders.id}) < (${after.at}, ${after.id})` : undefined,
      ),
    )
    .orderBy(desc(at), desc(workOrders.id))
    .limit(limit)
    .all();
}

/** Where a job stands in its list. */
export const placeOfJob = (job: JobRow): JobCursor => ({ at: job.closedAt ?? job.openedAt, id: job.id });

/** One job of the shop, open or closed. */
export function getJob(db: Handle, shopId: number, jobId: number) {
  return rowsOf(db)
    .where(and(eq(workOrders.shopId, shopId), eq(workOrders.id, jobId)))
    .get();
}

/** How many jobs are open. */
export function countOpenJobs(db: Handle, shopId: number): number {
  const row = db
    .select({ jobs: count() })
    .from(workOrders)
    .where(and(eq(workOrders.shopId, shopId), isNull(workOrders.closedAt)))
    .get();
  return row?.jobs ?? 0;
}

/** A job's row number by its number, whichever way its letters are written. */
export function findJobByNumber(db: Handle, shopId: number, number: string): number | undefined {
  return db
    .select({ id: workOrders.id })
    .from(workOrders)
    .where(and(eq(workOrders.shopId, shopId), sql`lower(${workOrders.number}) = lower(${number})`))
    .get()?.id;
}

/** Beyond this many names a list of suggestions is no help. */
const SUGGESTIONS = 500;

/** Names of the shop's customers, for a field that suggests them. */
export function listCustomerNames(db: Handle, shopId: number): string[] {
  return db
    .select({ name: customers.name })
    .from(customers)
    .where(eq(customers.shopId, shopId))
    .orderBy(asc(customers.name))
    .limit(SUGGESTIONS)
    .all()
    .map((row) => row.name);
}

/** The customer of that name, whichever way its letters are written; a new one where the shop has none. */
export function ensureCustomer(tx: Handle, shopId: number, name: string): number {
  const known = tx
    .select({ id: customers.id })
    .from(customers)
    .where(and(eq(customers.shopId, shopId), sql`lower(${customers.name}) = lower(${name})`))
    .get();
  if (known) return known.id;
  return tx.insert(customers).values({ shopId, name }).returning({ id: customers.id }).get().id;
}

type NewJob = Omit<typeof workOrders.$inferInsert, "id" | "closedAt">;

/** @returns the new job's row number */
export function insertWorkOrder(tx: Handle, job: NewJob): number {
  return tx.insert(workOrders).values(job).returning({ id: workOrders.id }).get().id;
}

type JobColumns = Pick<
  typeof workOrders.$inferInsert,
  "baseMetal" | "alloy" | "quantity" | "areaDm2" | "partValueCents" | "finalStack" | "closedAt"
>;

/** Writes some columns of a job of the shop. */
export function updateWorkOrder(tx: Handle, shopId: number, jobId: number, to: Partial<JobColumns>): void {
  tx.update(workOrders)
    .set(to)
    .where(and(eq(workOrders.shopId, shopId), eq(workOrders.id, jobId)))
    .run();
}
