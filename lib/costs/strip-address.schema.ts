import { z } from "zod";
import { metalField, MOST_LAYER_FIELDS, STRIP_FIELDS, thicknessField, toField } from "./strip-address";

/** Longer than anything that a field of the estimator can mean. */
const MOST_CHARS = 60;

/** One text of an address: the last of several (a pressed button comes after the field of its name), cut to a length; what is no text is not there. */
const text = z
  .preprocess(
    (raw: unknown) => (Array.isArray(raw) ? (raw as unknown[]).at(-1) : raw),
    z
      .string()
      .trim()
      .overwrite((typed) => typed.slice(0, MOST_CHARS))
      .optional(),
  )
  .catch(undefined);

const places = Array.from({ length: MOST_LAYER_FIELDS }, (_, index) => index + 1);

/** Every name that the estimator's address knows. `do` is a press of a button in a browser without script. */
export const STRIP_QUERY_NAMES: readonly string[] = [
  "case",
  "job",
  "do",
  ...STRIP_FIELDS,
  ...places.flatMap((place) => [metalField(place), thicknessField(place), toField(place)]),
];

/**
 * What the estimator's address says, as text: it takes anything and never fails, because a link that was mistyped must
 * still open. What the text means, and what is wrong with it, is read by `readStrip`, in the browser too.
 */
export const stripAddress = z.object(Object.fromEntries(STRIP_QUERY_NAMES.map((name) => [name, text])));
export type StripQuery = z.output<typeof stripAddress>;
