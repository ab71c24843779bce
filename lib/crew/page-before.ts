import { z } from "zod";

const shape = z.coerce.number().int().positive();

/** The row number that a list goes on from, as the address bar says it; undefined begins at the newest. */
export function pageBefore(asked: string | string[] | undefined): number | undefined {
  const read = shape.safeParse(Array.isArray(asked) ? asked[0] : asked);
  return read.success ? read.data : undefined;
}
