/**
 * The open format in which a library is taken out and brought in. The JSON Schema at /schemas/library-1.json is generated
 * from this one; change it only together with its version.
 */
import { z } from "zod";
import {
  libraryCauseSchema,
  libraryCautionSchema,
  libraryClassSchema,
  libraryFixSchema,
  librarySourceSchema,
} from "./library.schema";

export const LIBRARY_FORMAT = "coppertell-library";
export const LIBRARY_VERSION = 1;

/** A file may hold so much: fifteen times the shelf that ships, and still read in well under a second. */
export const FILE_LIMITS = { bytes: 4 * 1024 * 1024, depth: 12, classes: 400, entries: 4000 } as const;

const listOf = <Schema extends z.ZodType>(schema: Schema, most: number, of: string) =>
  z.array(schema).max(most, `A file holds at most ${most} ${of}.`);

export const libraryFileSchema = z
  .object({
    $schema: z.string().optional().meta({ description: "Address of this schema, for editors." }),
    format: z.literal(LIBRARY_FORMAT),
    version: z.literal(LIBRARY_VERSION),
    shop: z.string().max(200).meta({ description: "Name of the shop whose library it is." }),
    exportedAt: z.iso.datetime().meta({ description: "When it was taken out, UTC." }),
    classes: listOf(libraryClassSchema, FILE_LIMITS.classes, "classes"),
    causes: listOf(libraryCauseSchema, FILE_LIMITS.entries, "causes"),
    fixes: listOf(libraryFixSchema, FILE_LIMITS.entries, "fixes"),
    cautions: listOf(libraryCautionSchema, FILE_LIMITS.entries, "cautions"),
    sources: listOf(librarySourceSchema, FILE_LIMITS.entries, "sources"),
  })
  .meta({
    title: "Coppertell library, version 1",
    description:
      "Defect classes of a copper strike with their causes, fixes, cautions and sources. Entries point at one another by slug or key.",
  });
export type LibraryFile = z.output<typeof libraryFileSchema>;

/** The published JSON Schema, as text. It says what a file must be before it is read: what is trimmed or filled in is not asked. */
export function librarySchemaText(): string {
  const schema = z.toJSONSchema(libraryFileSchema, { io: "input", target: "draft-2020-12" });
  return `${JSON.stringify(schema, null, 2)}\n`;
}
