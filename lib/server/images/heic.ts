import "server-only";
import { execFile } from "node:child_process";
import fs from "node:fs/promises";
import path from "node:path";
import { promisify } from "node:util";
import { LIMITS } from "@/lib/cases/case-words";
import { fault } from "@/lib/fault";
import { withColourProfile } from "@/lib/photos/jpeg-segments";
import { REFUSALS } from "@/lib/photos/photo-refusals";
import { removeFile, settle } from "@/lib/server/storage";
import { heicSlot } from "./slots";

const run = promisify(execFile);
/** Of the JPEG that stands in for the HEIC file: near enough to the eye, a third of the bytes of a lossless one. */
export const ORIGINAL_JPEG_QUALITY = 92;
/** The decoder is slow: 1.5 s for 12 megapixels here, more on a busy server. */
const HEIC_TIMEOUT_MS = 60_000;

/**
 * Turns a HEIC (HEVC) file into an upright JPEG with the same colour profile, since the image library cannot read it.
 * @param target where the JPEG is written, settled on the disk
 * @throws FaultError "unsupported" when it cannot be decoded
 */
export async function heicToJpeg(source: string, target: string, icc: Uint8Array): Promise<void> {
  try {
    await heicSlot(() =>
      run(
        process.execPath,
        [childScript(), source, target, String(LIMITS.photoPixels), String(ORIGINAL_JPEG_QUALITY)],
        { timeout: HEIC_TIMEOUT_MS, killSignal: "SIGKILL" },
      ),
    );
  } catch (error) {
    await removeFile(target);
    throw Object.assign(fault("unsupported", REFUSALS.heicUnreadable), { cause: error });
  }
  if (icc.length > 0) await fs.writeFile(target, withColourProfile(await fs.readFile(target), icc));
  await settle(target);
}

function childScript(): string {
  return path.resolve(/*turbopackIgnore: true*/ process.cwd(), "lib/server/images/heic-child.mjs");
}
