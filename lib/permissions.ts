import type { Role } from "@/lib/cases/case-words";

/**
 * Who may do what: the only place that says it. Every action, route handler and button asks `can`.
 * "own" means a row that the person made themselves, "any" every row of their shop. No cell reaches another shop.
 */
export const PERMISSIONS = [
  "case.see",
  "case.snap",
  "case.call",
  "case.amend",
  "case.confirm",
  "card.work",
  "exemplar.choose",
  "job.keep",
  "job.change",
  "photo.add",
  "photo.withdraw",
  "library.see",
  "library.edit",
  "practice.do",
  "drill.set",
  "search.keep",
  "line.see",
  "line.log",
  "part.check",
  "plating.reckon",
  "money.case",
  "strip.estimate",
  "agreement.see",
  "ledger.see",
  "rates.set",
  "strips.set",
  "crew.manage",
  "audit.see",
  "outbox.see",
  "export.take",
  "account.edit",
] as const;
export type Permission = (typeof PERMISSIONS)[number];

export type Reach = "no" | "own" | "any";

type Matrix = Record<Permission, Record<Role, Reach>>;

export const MATRIX = {
  "case.see": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  "case.snap": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  "case.call": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  // Correcting the facts of a part that is still held: one's own snap, or any for those who take the second look.
  "case.amend": { plater: "own", trainee: "own", senior: "any", owner: "any" },
  "case.confirm": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  "card.work": { plater: "any", trainee: "no", senior: "any", owner: "any" },
  "exemplar.choose": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  // Opening a job: a plater whose parts belong to none must not be stuck at the snap.
  "job.keep": { plater: "any", trainee: "no", senior: "any", owner: "any" },
  // What later prices rest on, and whether a job is still open.
  "job.change": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  "photo.add": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  // Taking back a photo that no case holds yet.
  "photo.withdraw": { plater: "own", trainee: "own", senior: "own", owner: "own" },
  "library.see": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  "library.edit": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  // One's own questions and answers only; how others do is "agreement.see".
  "practice.do": { plater: "own", trainee: "own", senior: "own", owner: "own" },
  "drill.set": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  "search.keep": { plater: "own", trainee: "own", senior: "own", owner: "own" },
  "line.see": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  "line.log": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  // Weighing a part: a plater must be able to find out at the tank that the job card is wrong.
  "part.check": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  // Faraday's law and test pieces: arithmetic of the trade, no money in it.
  "plating.reckon": { plater: "any", trainee: "any", senior: "any", owner: "any" },
  "money.case": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  "strip.estimate": { plater: "no", trainee: "no", senior: "any", owner: "any" },
  "agreement.see": { plater: "own", trainee: "own", senior: "any", owner: "any" },
  "ledger.see": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  "rates.set": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  // The shop's baths and their rates: money rests on them, so they are the owner's as the rates are.
  "strips.set": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  "crew.manage": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  "audit.see": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  "outbox.see": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  "export.take": { plater: "no", trainee: "no", senior: "no", owner: "any" },
  "account.edit": { plater: "own", trainee: "own", senior: "own", owner: "own" },
} as const satisfies Matrix;

/** A signed-in member, as the database has them at this request. */
export interface Actor {
  memberId: number;
  shopId: number;
  roles: readonly Role[];
}

/**
 * How far a person's roles reach for a permission: the furthest of them.
 * @example reach(["plater", "senior"], "case.confirm") === "any"
 */
export function reach(roles: readonly Role[], permission: Permission): Reach {
  const cells = roles.map((role): Reach => MATRIX[permission][role]);
  if (cells.includes("any")) return "any";
  return cells.includes("own") ? "own" : "no";
}

/**
 * May this person do this, to this row? Without a row the answer is whether they may do it to any row at all.
 * @param row `ownerId` is the member who made the row
 */
export function can(actor: Actor, permission: Permission, row?: { shopId: number; ownerId: number }): boolean {
  const far = reach(actor.roles, permission);
  if (far === "no") return false;
  if (!row) return true;
  if (row.shopId !== actor.shopId) return false;
  return far === "any" || row.ownerId === actor.memberId;
}

/** The roles that reach a permission at all, for "this is for a senior tech" sentences. */
export function rolesFor(permission: Permission): Role[] {
  const row: Record<Role, Reach> = MATRIX[permission];
  return (Object.keys(row) as Role[]).filter((role) => row[role] !== "no");
}
