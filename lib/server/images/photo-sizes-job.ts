import "server-only";
import { z } from "zod";
import { getPhoto, refusePhoto, showPhoto } from "@/db/queries/photos";
import { forgetUpload } from "@/db/queries/uploads";
import type { Db, Handle } from "@/db/open";
import { fault } from "@/lib/fault";
import { photoId } from "@/lib/photos/photo-upload.schema";
import { photoPath, receivedPath } from "@/lib/photos/photo-path";
import { exists, inUploads, removeFile, uploadsRoot, writeDurably } from "@/lib/server/storage";
import { makeSizes } from "./sizes";
import { pictureSlot } from "./slots";

const payloadSchema = z.object({ photoId, shopId: z.number().int() });
type Payload = z.infer<typeof payloadSchema>;

/** What the job is given; read back from the database, so checked. */
export function readPhotoJob(payload: unknown): Payload {
  return payloadSchema.parse(payload);
}

/**
 * Makes a photo's sizes and shows it. Killed anywhere, it can run again: files are written beside their place and moved,
 * and the rows follow once every file stands.
 * @throws FaultError when its file is gone
 */
export async function photoSizesJob(db: Db, payload: unknown, now: number, root = uploadsRoot()): Promise<void> {
  const { photoId: id, shopId } = readPhotoJob(payload);
  const received = inUploads(root, receivedPath(shopId, id));
  if (getPhoto(db, shopId, id)?.state !== "processing") return removeFile(received);
  if (!(await exists(received)))
    throw fault("broken", "The photo's file is gone from the server. Take the photo again.");
  const made = await pictureSlot(() => makeSizes(received));
  const stored = made.map(({ content, ...size }) => ({
    ...size,
    content,
    path: photoPath(shopId, id, size.size, size.mime),
    bytes: content.length,
  }));
  for (const size of stored) await writeDurably(inUploads(root, size.path), size.content);
  const rows = stored.map(({ content: _content, ...row }) => row);
  const shown = db.transaction((tx) => showPhoto(tx, shopId, id, rows, now));
  // Withdrawn while we worked: its files go as well.
  if (!shown && !getPhoto(db, shopId, id)) for (const row of rows) await removeFile(inUploads(root, row.path));
  await removeFile(received);
}

/** What a job that is given up leaves behind: the photo says why. */
export function givePhotoUp(tx: Handle, payload: unknown, sentence: string): void {
  const { photoId: id, shopId } = readPhotoJob(payload);
  refusePhoto(tx, shopId, id, sentence);
  forgetUpload(tx, id);
}
