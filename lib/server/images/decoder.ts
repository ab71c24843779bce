import "server-only";
import sharp from "sharp";
import { LIMITS } from "@/lib/cases/case-words";

// A server holds no pictures between requests, and one thread a picture gives the most pictures a second on two cores.
sharp.cache(false);
sharp.concurrency(1);

/** Longest a single step on one picture may take. */
export const STEP_TIMEOUT_SECONDS = 15;

/**
 * Opens a picture for decoding: first frame only, upright, refused when it is damaged, a bomb, or takes too long.
 * @param source a file or its bytes
 */
export function openPicture(source: string | Buffer) {
  return sharp(source, { limitInputPixels: LIMITS.photoPixels, failOn: "warning", pages: 1 })
    .timeout({ seconds: STEP_TIMEOUT_SECONDS })
    .autoOrient();
}
