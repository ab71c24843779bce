import { and, asc, desc, eq, inArray, isNull, ne } from "drizzle-orm";
import { fault } from "@/lib/fault";
import type { PhotoPurpose, PhotoSize } from "@/lib/photos/photo-words";
import type { Handle } from "../open";
import { photos, photoSizes } from "../schema";

const casePhotoColumns = {
  id: photos.id,
  caseId: photos.caseId,
  round: photos.round,
  purpose: photos.purpose,
  position: photos.position,
  state: photos.state,
  refusal: photos.refusal,
  memberId: photos.memberId,
  width: photos.width,
  height: photos.height,
  takenAt: photos.takenAt,
  placeholder: photos.placeholder,
  isRendered: photos.isRendered,
};

/** A photo as a case's screens show it. */
export type CasePhoto = ReturnType<typeof listCasePhotos>[number];

/** All photos of a case, oldest round first, in the order in which they were taken. */
export function listCasePhotos(db: Handle, shopId: number, caseId: number) {
  return db
    .select(casePhotoColumns)
    .from(photos)
    .where(and(eq(photos.shopId, shopId), eq(photos.caseId, caseId)))
    .orderBy(asc(photos.round), asc(photos.position), asc(photos.id))
    .all();
}

/** For each case the photo that stands for it: the first one of its newest round that is not refused. */
export function listPhotosOfCases(db: Handle, shopId: number, caseIds: number[]): Map<number, CasePhoto> {
  if (caseIds.length === 0) return new Map();
  const rows = db
    .select(casePhotoColumns)
    .from(photos)
    .where(and(eq(photos.shopId, shopId), inArray(photos.caseId, caseIds), ne(photos.state, "refused")))
    .orderBy(desc(photos.round), asc(photos.position), asc(photos.id))
    .all();
  const chosen = new Map<number, CasePhoto>();
  for (const row of rows) if (row.caseId !== null && !chosen.has(row.caseId)) chosen.set(row.caseId, row);
  return chosen;
}

/** One photo of the shop, whatever its state. */
export function getPhoto(db: Handle, shopId: number, id: string) {
  return (
    db
      .select({ ...casePhotoColumns, bytes: photos.bytes, format: photos.format, fileName: photos.fileName })
      .from(photos)
      .where(and(eq(photos.shopId, shopId), eq(photos.id, id)))
      .get() ?? null
  );
}

/** Whose a photo's number is, over all shops: numbers are made by phones, so a stranger could name any. Nothing else of the row is told. */
export function getPhotoOwner(db: Handle, id: string): { shopId: number; memberId: number } | null {
  return (
    db.select({ shopId: photos.shopId, memberId: photos.memberId }).from(photos).where(eq(photos.id, id)).get() ?? null
  );
}

/** Where a stored size lies. */
export function getPhotoSize(db: Handle, shopId: number, photoId: string, size: PhotoSize) {
  return (
    db
      .select({ path: photoSizes.path, mime: photoSizes.mime, bytes: photoSizes.bytes })
      .from(photoSizes)
      .where(and(eq(photoSizes.shopId, shopId), eq(photoSizes.photoId, photoId), eq(photoSizes.size, size)))
      .get() ?? null
  );
}

interface Claim {
  shopId: number;
  memberId: number;
  caseId: number;
  round: number;
  purpose: PhotoPurpose;
  /** The phone's numbers, in the order in which the photos were taken. */
  ids: readonly string[];
  now: number;
}

/**
 * Puts photos on a case. One that has come in joins it; one that is still on its way is awaited. Doing it twice is doing it once.
 * @throws FaultError "conflict" when a number is another person's or is on another case
 */
export function claimPhotos(tx: Handle, claim: Claim): void {
  for (const [position, given] of claim.ids.entries()) claimOne(tx, claim, given.toLowerCase(), position);
}

function claimOne(tx: Handle, claim: Claim, id: string, position: number): void {
  const { shopId, memberId, caseId, round, purpose, now } = claim;
  const place = { caseId, round, purpose, position };
  tx.insert(photos)
    .values({ id, shopId, memberId, ...place, state: "awaited", fileName: "", createdAt: now })
    .onConflictDoNothing()
    .run();
  const row = tx
    .select({ shopId: photos.shopId, memberId: photos.memberId, caseId: photos.caseId })
    .from(photos)
    .where(eq(photos.id, id))
    .get();
  const isMine = row?.shopId === shopId && row.memberId === memberId && (row.caseId ?? caseId) === caseId;
  if (!isMine)
    throw fault("conflict", `Photo ${position + 1} belongs to another case. Take it away and take a new one.`);
  tx.update(photos)
    .set(place)
    .where(and(eq(photos.shopId, shopId), eq(photos.id, id), isNull(photos.caseId)))
    .run();
}

interface Accepted {
  id: string;
  shopId: number;
  memberId: number;
  purpose: PhotoPurpose;
  fileName: string;
  bytes: number;
  format: string;
  width: number;
  height: number;
  takenAt: number | null;
  placeholder: string;
  now: number;
}

/**
 * Records that a photo's file is safe and sound. Its case, if one awaits it, stays.
 * @returns false when the file was recorded before: nothing is left to do
 * @throws FaultError "refused" when the number is another person's
 */
export function acceptPhoto(tx: Handle, photo: Accepted): boolean {
  const { now, ...facts } = photo;
  const inserted = tx
    .insert(photos)
    .values({ ...facts, state: "processing", createdAt: now })
    .onConflictDoNothing()
    .run();
  if (inserted.changes > 0) return true;
  const owner = getPhotoOwner(tx, photo.id);
  if (owner?.shopId !== photo.shopId || owner.memberId !== photo.memberId) {
    throw fault("refused", "This photo was begun by somebody else. Take it again under your own name.");
  }
  const { fileName, bytes, format, width, height, takenAt, placeholder } = photo;
  const updated = tx
    .update(photos)
    .set({ fileName, bytes, format, width, height, takenAt, placeholder, state: "processing", refusal: null })
    .where(and(eq(photos.shopId, photo.shopId), eq(photos.id, photo.id), inArray(photos.state, ["awaited", "refused"])))
    .run();
  return updated.changes > 0;
}

interface StoredSize {
  size: PhotoSize;
  path: string;
  mime: string;
  bytes: number;
  width: number;
  height: number;
}

/**
 * Shows a photo: all its sizes stand on the disk. Width and height are those of the upright original.
 * @returns false when the photo has been withdrawn meanwhile
 */
export function showPhoto(tx: Handle, shopId: number, id: string, sizes: StoredSize[], now: number): boolean {
  const original = sizes.find((each) => each.size === "original");
  if (!original) throw new RangeError("sizes: the original is missing");
  const updated = tx
    .update(photos)
    .set({ state: "ready", readyAt: now, width: original.width, height: original.height, refusal: null })
    .where(and(eq(photos.shopId, shopId), eq(photos.id, id), eq(photos.state, "processing")))
    .run();
  if (updated.changes === 0) return false;
  tx.delete(photoSizes)
    .where(and(eq(photoSizes.shopId, shopId), eq(photoSizes.photoId, id)))
    .run();
  tx.insert(photoSizes)
    .values(sizes.map((each) => ({ ...each, shopId, photoId: id })))
    .run();
  return true;
}

/** Says on the case why a photo could not be kept. A photo that is ready stays ready. */
export function refusePhoto(tx: Handle, shopId: number, id: string, refusal: string): void {
  tx.update(photos)
    .set({ state: "refused", refusal })
    .where(and(eq(photos.shopId, shopId), eq(photos.id, id), inArray(photos.state, ["awaited", "processing"])))
    .run();
}

/**
 * Takes back a photo that no case holds.
 * @returns the paths of its files under the uploads folder; null when a case holds it or it is not there
 */
export function withdrawPhoto(tx: Handle, shopId: number, id: string): string[] | null {
  const isLoose = and(eq(photos.shopId, shopId), eq(photos.id, id), isNull(photos.caseId));
  if (!tx.select({ id: photos.id }).from(photos).where(isLoose).get()) return null;
  const sizes = tx
    .delete(photoSizes)
    .where(and(eq(photoSizes.shopId, shopId), eq(photoSizes.photoId, id)))
    .returning({ path: photoSizes.path })
    .all();
  tx.delete(photos).where(isLoose).run();
  return sizes.map((each) => each.path);
}
