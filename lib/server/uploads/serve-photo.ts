import "server-only";
import { getPhoto, getPhotoSize } from "@/db/queries/photos";
import type { SignedIn } from "@/db/queries/crew";
import type { Db } from "@/db/open";
import { fault } from "@/lib/fault";
import type { PhotoSize } from "@/lib/photos/photo-words";
import { exists, inUploads, streamFile, uploadsRoot } from "@/lib/server/storage";

/**
 * Sends a stored size to somebody who may see it: a case's photo to the whole shop, a loose one to whoever took it.
 * Its bytes never change, so the browser may keep it for good; only this person's browser, not a proxy.
 * @throws FaultError "not-found" when it is not there, not theirs to see, or not ready
 */
export async function servePhoto(
  db: Db,
  member: SignedIn,
  { id, size }: { id: string; size: PhotoSize },
  request: Request,
  root = uploadsRoot(),
): Promise<Response> {
  demandVisible(db, member, id);
  const stored = getPhotoSize(db, member.shopId, id, size);
  const file = stored && inUploads(root, stored.path);
  if (!file || !(await exists(file))) throw fault("not-found", "That photo is not here.");
  const etag = `"${id}-${size}-${stored.bytes}"`;
  const headers = {
    "Cache-Control": "private, max-age=31536000, immutable",
    ETag: etag,
    "X-Content-Type-Options": "nosniff",
  };
  if (request.headers.get("if-none-match")?.includes(etag)) return new Response(null, { status: 304, headers });
  const ending = stored.path.slice(stored.path.lastIndexOf("."));
  return new Response(streamFile(file), {
    headers: {
      ...headers,
      "Content-Type": stored.mime,
      "Content-Length": String(stored.bytes),
      // The name that the file had on the phone may tell something.
      "Content-Disposition": `inline; filename="photo-${id.slice(0, 8)}-${size}${ending}"`,
    },
  });
}

function demandVisible(db: Db, member: SignedIn, id: string): void {
  const photo = getPhoto(db, member.shopId, id);
  const isVisible = photo && (photo.caseId !== null || photo.memberId === member.memberId);
  if (!isVisible) throw fault("not-found", "That photo is not here.");
  if (photo.state === "refused") throw fault("not-found", photo.refusal ?? "That photo could not be kept.");
  if (photo.state === "awaited") throw fault("not-found", "The photo is still on its way from the phone.");
  if (photo.state === "processing") {
    throw fault("not-found", "The photo is still being prepared. Look again in a few seconds.");
  }
}
