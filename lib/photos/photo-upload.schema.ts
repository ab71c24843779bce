import { z } from "zod";
import { PHOTO_PURPOSES } from "./photo-words";

export const photoId = z.uuid({ error: "is not a photo's number" }).toLowerCase();

/** What the phone says about a photo when it asks for a place to send it to. */
export const photoUploadInput = z.object({
  photoId,
  purpose: z.enum(PHOTO_PURPOSES),
  /** The file's own time, UTC ms: used where the camera left no record. */
  takenAt: z.number().int().positive().optional(),
});
export type PhotoUploadInput = z.infer<typeof photoUploadInput>;

/** What the upload service keeps with the file and hands back when it has come in. */
export const uploadTicket = z.object({
  photoId,
  shopId: z.number().int(),
  memberId: z.number().int(),
  purpose: z.enum(PHOTO_PURPOSES),
  takenAt: z.number().int().nullable(),
});
export type UploadTicket = z.infer<typeof uploadTicket>;

/** What comes back to the phone once the file has been looked at. */
export type UploadVerdict = { state: "kept" } | { state: "refused"; code: string; sentence: string };
