/** What the page that brings a library in sends. */
import { z } from "zod";
import { SHELF_KINDS } from "./entry-kinds";

/** "cause/cleaner-spent@3": an entry of the file, and the shop's revision that it was set against (0: new). */
const pick = z
  .string()
  .regex(/^[a-z]+\/[a-z0-9-]{1,120}@\d{1,9}$/, "This is no entry of the file.")
  .transform((text, context) => {
    const [head = "", revision = ""] = text.split("@");
    const [kind, slug = ""] = head.split("/");
    const known = SHELF_KINDS.find((each) => each === kind);
    if (known) return { kind: known, slug, seenRevision: Number(revision) };
    context.addIssue({ code: "custom", message: "This is no entry of the file." });
    return z.NEVER;
  });

export const lookInput = z.object({
  /** A chosen file; its text is read by the action. */
  file: z.instanceof(Blob, { error: "Choose a file first." }),
});

export const bringInInput = z.object({
  from: z.enum(["file", "shelf"]),
  /** The file's text, as it was looked at; empty for the shelf that ships. */
  text: z.string().default(""),
  pick: z.array(pick, "Choose at least one entry.").min(1, "Choose at least one entry."),
  as: z.enum(["drafts", "publish"], { error: "Say whether as drafts or published at once." }),
});
export type BringIn = z.output<typeof bringInInput>;
