import { createHmac } from "node:crypto";

/** The app's name towards its own stand-in of the upload service. */
export const LOCAL_APP_ID = "coppertell";
/** The region by which a token says that it belongs to the stand-in. */
export const LOCAL_REGION = "local";

/**
 * The upload service's token for the stand-in in this app: base64 of JSON, as the hosted service gives them out.
 * @param secret the app's own secret; the upload key is derived from it and tells nothing about it
 * @throws RangeError when the secret is shorter than 16 characters
 */
export function localUploadToken(secret: string): string {
  if (secret.length < 16) throw new RangeError("secret: at least 16 characters");
  const apiKey = `sk_${createHmac("sha256", secret).update("coppertell upload key").digest("hex")}`;
  return Buffer.from(JSON.stringify({ apiKey, appId: LOCAL_APP_ID, regions: [LOCAL_REGION] })).toString("base64");
}

/**
 * The variables of an `.env` that uses the stand-in. Leaving them all out means the same.
 * @param origin the address at which people open the app, as in "http://localhost:3000"
 */
export function localUploadEnv(origin: string, secret: string): Record<string, string> {
  return {
    UPLOADTHING_TOKEN: localUploadToken(secret),
    UPLOADTHING_INGEST_URL: `${origin}/api/ingest`,
    UPLOADTHING_CALLBACK_URL: `${origin}/api/uploadthing`,
  };
}
