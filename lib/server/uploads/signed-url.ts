import { createHmac, timingSafeEqual } from "node:crypto";
import { z } from "zod";
import { fault } from "@/lib/fault";
import { photoId } from "@/lib/photos/photo-upload.schema";

const SIGNATURE = "&signature=";

/** What a signed address says about the file that may be sent to it. Values are encoded twice by the service's kit. */
const signedSchema = z.object({
  expires: z.coerce.number().int(),
  "x-ut-file-name": z.string(),
  "x-ut-file-size": z.coerce.number().int().nonnegative(),
  "x-ut-file-type": z.string().default(""),
  "x-ut-slug": z.string(),
  "x-ut-custom-id": photoId,
});

export interface SignedUpload {
  key: string;
  customId: string;
  name: string;
  size: number;
  type: string;
  slug: string;
}

/** `hmac-sha256=<hex>` of a text, as the upload service signs addresses and callbacks. */
export function sign(text: string, apiKey: string): string {
  return `hmac-sha256=${createHmac("sha256", apiKey).update(text).digest("hex")}`;
}

/** Compares in constant time, so that the time taken tells nothing. */
export function isSame(given: string, expected: string): boolean {
  const [a, b] = [Buffer.from(given), Buffer.from(expected)];
  return a.length === b.length && timingSafeEqual(a, b);
}

/**
 * Checks a signed upload address. It is built again from our own ingest address: the one in the request carries
 * whatever host the server is bound to.
 * @param search the query as it came, with its question mark, undecoded
 * @throws FaultError "refused" when the signature is wrong, something is appended, or the address has expired
 */
export function readSignedUpload(
  request: { key: string; search: string },
  config: { ingestUrl: string; apiKey: string },
  now: number,
): SignedUpload {
  const at = request.search.lastIndexOf(SIGNATURE);
  if (at < 0) throw fault("refused", "This upload address is not signed. Start the upload again.");
  const expected = sign(`${config.ingestUrl}/${request.key}${request.search.slice(0, at)}`, config.apiKey);
  const given = decodeURIComponent(request.search.slice(at + SIGNATURE.length));
  if (!isSame(given, expected)) throw fault("refused", "This upload address has been changed. Start the upload again.");
  const signed = readValues(request.search.slice(0, at));
  if (signed.expires < now) throw fault("refused", "This upload address has expired. Start the upload again.");
  return {
    key: request.key,
    customId: signed["x-ut-custom-id"],
    name: signed["x-ut-file-name"],
    size: signed["x-ut-file-size"],
    type: signed["x-ut-file-type"],
    slug: signed["x-ut-slug"],
  };
}

function readValues(search: string) {
  const once = new URLSearchParams(search);
  const twice = Object.fromEntries([...once].map(([name, value]) => [name, decodeURIComponent(value)]));
  const result = signedSchema.safeParse(twice);
  if (!result.success) throw fault("refused", "This upload address is not complete. Start the upload again.");
  return result.data;
}
