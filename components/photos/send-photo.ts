import { genUploader } from "uploadthing/client";
import type { FileRoute } from "uploadthing/types";
import type { PhotoUploadInput, UploadVerdict } from "@/lib/photos/photo-upload.schema";
import { NO_SIGNAL } from "./photo-line";
import type { UnsentPhoto } from "./unsent-photos";

/** What became of a try to send. */
export type SendOutcome =
  | { kind: "kept" }
  | { kind: "refused"; words: string }
  | { kind: "signed-out" }
  | { kind: "later"; words: string }
  | { kind: "stopped" };

/** What the server's upload route takes and gives. Its own type lies with the server, which a component may not import. */
interface PhotoRoute {
  photo: FileRoute<{
    input: PhotoUploadInput;
    output: UploadVerdict;
    errorShape: { message: string; detail: string; code: string };
  }>;
}

const { uploadFiles } = genUploader<PhotoRoute & Record<string, PhotoRoute["photo"]>>({ package: "coppertell" });

/** A line on which nothing has moved for so long is dead, even if nobody has said so. */
const STALLED_MS = 60_000;
const LATER = "The server could not take it yet. It is tried again by itself.";

/**
 * Sends a photo, from where the last try stopped.
 * @param onShare told how much has gone up, 0 to 1
 * @param signal aborted when the person takes the photo away
 */
export async function sendPhoto(
  photo: UnsentPhoto,
  onShare: (share: number) => void,
  signal: AbortSignal,
): Promise<SendOutcome> {
  const { id: photoId, purpose, takenAt, name, type } = photo;
  const file = new File([photo.content], name, { type, lastModified: takenAt });
  const stall = watchStall(signal);
  try {
    const [sent] = await uploadFiles("photo", {
      files: [file],
      input: { photoId, purpose, ...(takenAt > 0 ? { takenAt } : {}) },
      signal: stall.signal,
      onUploadProgress: ({ loaded }) => {
        stall.moved();
        onShare(Math.min(1, loaded / file.size));
      },
    });
    // Sent by way of the hosted service, a refusal comes back as the answer of an upload that went well.
    const verdict = sent?.serverData;
    return verdict?.state === "refused" ? { kind: "refused", words: verdict.sentence } : { kind: "kept" };
  } catch (error) {
    return signal.aborted ? { kind: "stopped" } : readFailure(error);
  } finally {
    stall.over();
  }
}

function watchStall(taken: AbortSignal) {
  const abort = new AbortController();
  taken.addEventListener("abort", () => abort.abort(), { once: true });
  let timer = setTimeout(() => abort.abort(), STALLED_MS);
  return {
    signal: abort.signal,
    moved: () => {
      clearTimeout(timer);
      timer = setTimeout(() => abort.abort(), STALLED_MS);
    },
    over: () => clearTimeout(timer),
  };
}

/** The server's words come as `cause` before the upload and as `data` after it. Without words the line broke. */
function readFailure(error: unknown): SendOutcome {
  const answer = [field(error, "cause"), field(error, "data")].find(
    (each) => typeof field(each, "detail") === "string",
  );
  const words = field(answer, "detail");
  const code = field(answer, "code");
  if (typeof words !== "string") return { kind: "later", words: navigator.onLine ? LATER : NO_SIGNAL };
  if (code === "signed-out") return { kind: "signed-out" };
  return code === "broken" || code === "too-many" ? { kind: "later", words } : { kind: "refused", words };
}

function field(from: unknown, name: string): unknown {
  return typeof from === "object" && from !== null ? Reflect.get(from, name) : undefined;
}
