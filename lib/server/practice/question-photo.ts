import "server-only";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getPhoto, getPhotoSize } from "@/db/queries/photos";
import { fault } from "@/lib/fault";
import { openPicture } from "@/lib/server/images/decoder";
import { pictureSlot } from "@/lib/server/images/slots";
import { exists, inUploads, uploadsRoot } from "@/lib/server/storage";
import { requireQuestion } from "./practise";

type QuestionPhotoSize = "view" | "thumb";

/** Of the picture encoded anew: near enough to the eye, quick enough for each question. */
const QUALITY = 80;
/** Most pixels cut off each edge. */
const MOST_CUT = 4;

/**
 * Sends the photo of a question to the person who was asked. Nothing in the answer leads to the photo's case: the name
 * and the mark come from the question, no date is told, and the picture is cut by a hair and encoded anew, so that
 * neither its length nor its bytes are those of the photo in the casebook.
 * @throws FaultError "not-found" when the question is not theirs or the photo is not ready
 */
export async function serveQuestionPhoto(
  db: Db,
  member: SignedIn,
  { id, size }: { id: string; size: QuestionPhotoSize },
  root = uploadsRoot(),
): Promise<Response> {
  const question = requireQuestion(db, member, id);
  const stored = getPhotoSize(db, member.shopId, question.photoId, size);
  const file = stored && inUploads(root, stored.path);
  const isReady = getPhoto(db, member.shopId, question.photoId)?.state === "ready";
  if (!file || !isReady || !(await exists(file))) throw fault("not-found", "This photo cannot be shown just now.");
  const picture = await pictureSlot(() => encodeAnew(file, id));
  return new Response(new Uint8Array(picture), {
    headers: {
      "Content-Type": "image/webp",
      "Content-Length": String(picture.length),
      "Content-Disposition": `inline; filename="practice-${size}.webp"`,
      "Cache-Control": "private, max-age=3600",
      ETag: `"${id}-${size}"`,
      "X-Content-Type-Options": "nosniff",
    },
  });
}

async function encodeAnew(file: string, id: string): Promise<Buffer> {
  const { width, height } = await openPicture(file).metadata();
  const [left = 0, top = 0, right = 0, bottom = 0] = cutOf(id);
  const isLargeEnough = width > 8 * MOST_CUT && height > 8 * MOST_CUT;
  const picture = isLargeEnough
    ? openPicture(file).extract({ left, top, width: width - left - right, height: height - top - bottom })
    : openPicture(file);
  return picture.webp({ quality: QUALITY, effort: 2 }).toBuffer();
}

/** Pixels off each edge, 1 to MOST_CUT, always the same for the same question. */
function cutOf(id: string): number[] {
  return [...Buffer.from(id, "base64url").subarray(0, 4)].map((byte) => 1 + (byte % MOST_CUT));
}
