import { z } from "zod";
import { getPhoto } from "@/db/queries/photos";
import { fault } from "@/lib/fault";
import { photoId } from "@/lib/photos/photo-upload.schema";
import { handle } from "@/lib/server/handle";
import { uploadsRoot } from "@/lib/server/storage";
import { takeBackPhoto } from "@/lib/server/uploads/withdraw";

const input = z.object({ id: photoId });

/** How far a photo is: `awaited`, `processing`, `ready`, or `refused` with the reason. */
export const GET = handle({
  permission: "case.see",
  input,
  run: ({ db, member, input: { id } }) => {
    const photo = getPhoto(db, member.shopId, id);
    const isVisible = photo && (photo.caseId !== null || photo.memberId === member.memberId);
    if (!isVisible) throw fault("not-found", "That photo is not here.");
    const { state, refusal, purpose, width, height, takenAt, placeholder } = photo;
    return { id, state, refusal, purpose, width, height, takenAt, placeholder };
  },
});

/** Takes back one's own photo, as long as no case holds it. */
export const DELETE = handle({
  permission: "photo.withdraw",
  input,
  run: async ({ db, member, input: { id } }) => {
    await takeBackPhoto(db, uploadsRoot(), member, id);
    return { withdrawn: id };
  },
});
