import "server-only";
import { acceptPhoto, getPhoto, getPhotoOwner, refusePhoto } from "@/db/queries/photos";
import { finishUpload, forgetUpload, getSender } from "@/db/queries/uploads";
import type { Db } from "@/db/open";
import { FaultError, fault, type Fault } from "@/lib/fault";
import { can } from "@/lib/permissions";
import { REFUSALS } from "@/lib/photos/photo-refusals";
import { receivedPath } from "@/lib/photos/photo-path";
import type { UploadTicket, UploadVerdict } from "@/lib/photos/photo-upload.schema";
import { takenAt } from "@/lib/server/images/capture-record";
import { pictureSlot } from "@/lib/server/images/slots";
import { verifyPhoto, type SoundPhoto } from "@/lib/server/images/verify";
import { wakeJobs } from "@/lib/server/job-clock";
import { enqueue } from "@/lib/server/jobs";
import { inUploads, moveDurably, removeFile, settle, sizeOf } from "@/lib/server/storage";

interface Incoming {
  ticket: UploadTicket;
  fileName: string;
  /** The whole file, still in the incoming folder. Gone afterwards, unless something broke on our side. */
  file: string;
}

/**
 * Takes a photo in once its file has come whole: looked at, safe on the disk, then recorded together with the job that
 * makes its sizes. What is not a photo leaves nothing but a sentence. Doing it twice is doing it once.
 * @throws Error when something broke on our side: the file stays, the phone tries again
 */
export async function takeInPhoto(db: Db, root: string, incoming: Incoming, now: number): Promise<UploadVerdict> {
  const { ticket, file } = incoming;
  try {
    const timeZone = demandSender(db, ticket);
    const state = getPhoto(db, ticket.shopId, ticket.photoId)?.state;
    if (state === "processing" || state === "ready") {
      await removeFile(file);
      return { state: "kept" };
    }
    await settle(file);
    const bytes = await sizeOf(file);
    const sound = await pictureSlot(() => verifyPhoto(file));
    await moveDurably(sound.file, inUploads(root, receivedPath(ticket.shopId, ticket.photoId)));
    record(db, incoming, { sound, bytes, takenAt: takenAt(sound.exif, timeZone, ticket.takenAt, now) }, now);
    await removeFile(file);
    wakeJobs();
    return { state: "kept" };
  } catch (error) {
    if (!(error instanceof FaultError)) throw error;
    await removeFile(file);
    return refuse(db, ticket, error.fault);
  }
}

/** @returns the shop's time zone */
function demandSender(db: Db, { shopId, memberId, photoId }: UploadTicket): string {
  const sender = getSender(db, shopId, memberId);
  if (!sender || !can(sender, "photo.add")) throw fault("refused", REFUSALS.gone);
  const owner = getPhotoOwner(db, photoId);
  if (owner && (owner.shopId !== shopId || owner.memberId !== memberId)) throw fault("refused", REFUSALS.notYours);
  return sender.timeZone;
}

interface Facts {
  sound: SoundPhoto;
  bytes: number;
  takenAt: number | null;
}

function record(db: Db, { ticket, fileName }: Incoming, { sound, bytes, takenAt: at }: Facts, now: number): void {
  const { photoId: id, shopId, memberId, purpose } = ticket;
  const { format, width, height, placeholder } = sound;
  db.transaction((tx) => {
    const photo = { id, shopId, memberId, purpose, fileName, bytes, format, width, height, placeholder };
    const isNew = acceptPhoto(tx, { ...photo, takenAt: at, now });
    if (isNew) enqueue(tx, { shopId, kind: "photo-sizes", payload: { photoId: id, shopId }, now });
    finishUpload(tx, id, now);
  });
}

function refuse(db: Db, { shopId, memberId, photoId }: UploadTicket, { code, message }: Fault): UploadVerdict {
  db.transaction((tx) => {
    const owner = getPhotoOwner(tx, photoId);
    // A case that awaits this very photo says why it never came.
    if (owner?.shopId === shopId && owner.memberId === memberId) refusePhoto(tx, shopId, photoId, message);
    forgetUpload(tx, photoId);
  });
  return { state: "refused", code, sentence: message };
}
