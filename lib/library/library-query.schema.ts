import { z } from "zod";
import { LIMITS } from "@/lib/cases/case-words";

/** What the library's address may say. */
export const libraryQuerySchema = z.object({
  q: z.string().trim().max(LIMITS.nameChars, "Search with a few words.").default(""),
  /** Slug of a station of the shop's line. */
  station: z.string().max(60).optional(),
});
