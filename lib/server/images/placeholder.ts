import "server-only";
import { rgbaToThumbHash } from "thumbhash";
import { openPicture } from "./decoder";

/** The hash takes pictures up to 100 px. */
const HASH_EDGE_PX = 100;

/**
 * A few bytes from which a blurred picture is drawn until the photo has loaded, so that nothing jumps.
 * Decodes the whole file, so a damaged one throws here.
 * @returns base64
 */
export async function makePlaceholder(source: string): Promise<string> {
  const { data, info } = await openPicture(source)
    .resize(HASH_EDGE_PX, HASH_EDGE_PX, { fit: "inside" })
    .toColourspace("srgb")
    .ensureAlpha()
    .raw()
    .toBuffer({ resolveWithObject: true });
  return Buffer.from(rgbaToThumbHash(info.width, info.height, data)).toString("base64");
}
