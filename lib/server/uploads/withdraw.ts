import "server-only";
import { getPhoto, withdrawPhoto } from "@/db/queries/photos";
import { forgetUpload, getUploadedFile } from "@/db/queries/uploads";
import type { SignedIn } from "@/db/queries/crew";
import type { Db } from "@/db/open";
import { fault } from "@/lib/fault";
import { can } from "@/lib/permissions";
import { incomingPath, receivedPath } from "@/lib/photos/photo-path";
import { uploadTicket } from "@/lib/photos/photo-upload.schema";
import { inUploads, removeFile } from "@/lib/server/storage";
import { takeOver } from "./writers";

/**
 * Takes back a photo that no case holds, or one that is still coming in. Its files go with it.
 * @throws FaultError "not-found", "refused" when it is another person's, "conflict" when a case holds it
 */
export async function takeBackPhoto(db: Db, root: string, member: SignedIn, id: string): Promise<void> {
  const photo = getPhoto(db, member.shopId, id);
  const begun = uploadTicket.safeParse(getUploadedFile(db, id)?.callback.metadata);
  const owner = photo ? { shopId: member.shopId, memberId: photo.memberId } : begun.data;
  if (!owner || owner.shopId !== member.shopId) throw fault("not-found", "That photo is not here. It may have been taken back.");
  if (!can(member, "photo.withdraw", { shopId: owner.shopId, ownerId: owner.memberId })) {
    throw fault("refused", "Somebody else took this photo. Only they can take it back.");
  }
  // Whoever still sends it is cut off and waited for, so that it cannot come in behind our back.
  const release = await takeOver(id);
  try {
    await remove(db, root, member.shopId, id);
  } finally {
    release();
  }
}

async function remove(db: Db, root: string, shopId: number, id: string): Promise<void> {
  const paths = db.transaction((tx) => {
    const freed = getPhoto(tx, shopId, id) ? withdrawPhoto(tx, shopId, id) : [];
    if (!freed) throw fault("conflict", "A case holds this photo, so it stays: nothing in a case's history is removed.");
    forgetUpload(tx, id);
    return freed;
  });
  for (const path of [...paths, incomingPath(id), receivedPath(shopId, id)]) {
    await removeFile(inUploads(root, path));
  }
}
