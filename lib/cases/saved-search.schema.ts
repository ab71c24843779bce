import { z } from "zod";
import { casebookAddress, filtersSet, readCasebookAddress } from "./casebook-address";

/** Searches that one person keeps; more than these nobody finds again. */
export const MOST_SAVED = 40;
export const SAVED_NAME_CHARS = 60;

const name = z
  .string()
  .trim()
  .min(1, "Give the search a name.")
  .max(SAVED_NAME_CHARS, `Use at most ${SAVED_NAME_CHARS} letters.`);
const id = z.coerce.number().int().positive();

/** A casebook address as text, brought to the form in which it is kept: filters, order and view that can be used. */
const address = z
  .string()
  .max(2000, "That search is too long to keep.")
  .transform((text, context) => {
    const { query } = readCasebookAddress(Object.fromEntries(new URLSearchParams(text)));
    if (filtersSet(query).length > 0) return new URLSearchParams(casebookAddress(query)).toString();
    context.addIssue({ code: "custom", message: "Nothing is narrowed yet. Set a filter or search for a word first." });
    return z.NEVER;
  });

export const keepSearchSchema = z.object({ name, query: address });
export const renameSearchSchema = z.object({ id, name });
export const removeSearchSchema = z.object({ id });
export type KeepSearch = z.output<typeof keepSearchSchema>;
