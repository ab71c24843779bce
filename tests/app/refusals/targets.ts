import { randomBytes, randomUUID } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import { and, asc, eq } from "drizzle-orm";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import { putQuestion } from "@/db/changes/practice-call";
import { setDrill } from "@/db/changes/practice-drill";
import type { Db } from "@/db/open";
import { requireCase } from "@/db/queries/cases";
import type { SignedIn } from "@/db/queries/crew";
import { insertInvite } from "@/db/queries/invites";
import { insertSavedSearch } from "@/db/queries/saved-searches";
import { invites, photos, photoSizes, reworkCards, reworkSteps, workOrders } from "@/db/schema";
import { photoPath } from "@/lib/photos/photo-path";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmedPhoto, keepPhotoFiles } from "@/tests/fixtures/practice-photos";
import { confirmFor, makeCase, type TestShop } from "@/tests/fixtures/shop-factory";

/** One copper pixel as lossless WebP, so that a photo can really be encoded anew. */
const TINY_WEBP = Buffer.from("UklGRh4AAABXRUJQVlA4TBEAAAAvAAAAAAfQueJ2pv+BiOh/AAA=", "base64");

/** Rows for a call to aim at: in a shop, made by a member of it. */
export interface Aim {
  db: Db;
  shop: TestShop;
  by: SignedIn;
}

export const heldCase = ({ db, shop, by }: Aim) => makeCase(db, shop, { by });
export const confirmedCase = (aim: Aim) => confirmFor(aim.db, aim.shop, heldCase(aim));

/** A casebook search that somebody keeps. */
export function keptSearch({ db, by }: Aim): number {
  return insertSavedSearch(db, by, { name: "Kept", query: "metal=steel", at: TEST_NOW }).id;
}

/** Row numbers of the steps of a case's newest card, in order. */
export function stepsOf({ db }: Aim, caseId: number): number[] {
  return db
    .select({ id: reworkSteps.id })
    .from(reworkSteps)
    .innerJoin(reworkCards, eq(reworkCards.id, reworkSteps.cardId))
    .where(eq(reworkCards.caseId, caseId))
    .orderBy(asc(reworkSteps.id))
    .all()
    .map((row) => row.id);
}

const doerOf = ({ shop }: Aim) => ({
  shopId: shop.shopId,
  memberId: shop.members.plater.memberId,
  now: TEST_NOW + 600_000,
});

/** A case whose card is done but for its outcome. */
export function tickedCase(aim: Aim) {
  const confirmed = confirmedCase(aim);
  for (const stepId of stepsOf(aim, confirmed.id)) {
    tickStep(aim.db, doerOf(aim), requireCase(aim.db, aim.shop.shopId, confirmed.ref), { stepId, spentMinutes: 5 });
  }
  return requireCase(aim.db, aim.shop.shopId, confirmed.ref);
}

export function closedCase(aim: Aim) {
  const ticked = tickedCase(aim);
  recordOutcome(aim.db, doerOf(aim), ticked, { ref: ticked.ref, outcome: "sound", note: "Tape clean", photoIds: [] });
  return requireCase(aim.db, aim.shop.shopId, ticked.ref);
}

/** A ready photo of a confirmed case, its file on the disk. */
export function readyPhoto(aim: Aim, uploads: string) {
  const photoId = randomUUID();
  const confirmed = confirmFor(aim.db, aim.shop, makeCase(aim.db, aim.shop, { by: aim.by, photoIds: [photoId] }));
  const where = photoPath(aim.shop.shopId, photoId, "thumb", "image/webp");
  fs.mkdirSync(path.dirname(path.join(uploads, where)), { recursive: true });
  fs.writeFileSync(path.join(uploads, where), "webp");
  aim.db.update(photos).set({ state: "ready" }).where(eq(photos.id, photoId)).run();
  aim.db
    .insert(photoSizes)
    .values({
      shopId: aim.shop.shopId,
      photoId,
      size: "thumb",
      path: where,
      mime: "image/webp",
      bytes: 4,
      width: 1,
      height: 1,
    })
    .run();
  return { ...confirmed, photoId };
}

/** A drill of one photo, set for the person that the call aims at. */
export function setDrillFor(aim: Aim): number {
  const { db, shop, by } = aim;
  confirmedPhoto(db, shop, { by: shop.members.otherPlater });
  return setDrill(
    db,
    { shopId: shop.shopId, memberId: shop.members.senior.memberId, now: TEST_NOW },
    { title: "Underactivation", classSlugs: ["underactivation"], photoCount: 1, memberIds: [by.memberId], dueAt: null },
  );
}

/** A practice question that was put to the person that the call aims at; its photo can be sent. */
export function openQuestion({ db, shop, by }: Aim, uploads: string): string {
  const { photoId, id: caseId } = confirmedPhoto(db, shop, { by: shop.members.otherPlater });
  keepPhotoFiles(db, shop, photoId, uploads, TINY_WEBP);
  const id = randomBytes(16).toString("base64url");
  putQuestion(
    db,
    { shopId: shop.shopId, memberId: by.memberId, now: TEST_NOW },
    { id, photoId, caseId, drillId: null },
  );
  return id;
}

/** A photo that no case holds yet. */
export function loosePhoto({ db, shop, by }: Aim): string {
  const id = randomUUID();
  db.insert(photos)
    .values({
      id,
      shopId: shop.shopId,
      memberId: by.memberId,
      purpose: "suspect",
      state: "ready",
      fileName: "a.jpg",
      createdAt: TEST_NOW,
    })
    .run();
  return id;
}

/** The shop's job, closed. */
export function closedJob({ db, shop }: Aim): number {
  db.update(workOrders).set({ closedAt: TEST_NOW }).where(eq(workOrders.id, shop.jobId)).run();
  return shop.jobId;
}

export function pendingInvite({ db, shop }: Aim): number {
  const tokenHash = randomUUID();
  insertInvite(db, {
    shopId: shop.shopId,
    email: `${tokenHash}@new.example`,
    name: "New Person",
    roles: ["plater"],
    tokenHash,
    invitedById: shop.members.owner.memberId,
    now: Date.now(),
    expiresAt: Date.now() + 86_400_000,
  });
  const row = db
    .select({ id: invites.id })
    .from(invites)
    .where(and(eq(invites.shopId, shop.shopId), eq(invites.tokenHash, tokenHash)))
    .get();
  if (!row) throw new Error("The invite was not kept.");
  return row.id;
}
