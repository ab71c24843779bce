import { z } from "zod";
import { PHOTO_SIZES } from "@/lib/photos/photo-words";
import { photoId } from "@/lib/photos/photo-upload.schema";
import { handle } from "@/lib/server/handle";
import { servePhoto } from "@/lib/server/uploads/serve-photo";

/** A size of a photo. While its sizes are being made the answer is 404 with words: nothing half-made is ever shown. */
export const GET = handle({
  permission: "case.see",
  input: z.object({ id: photoId, size: z.enum(PHOTO_SIZES, { error: "is thumb, view or original" }) }),
  run: ({ db, member, input, request }) => servePhoto(db, member, input, request),
});
