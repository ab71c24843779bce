import { z } from "zod";
import type { Env } from "@/lib/env";
import { LOCAL_REGION, localUploadToken } from "./token";

const tokenSchema = z.object({
  apiKey: z.string().startsWith("sk_"),
  appId: z.string().min(1),
  regions: z.array(z.string()).min(1),
});

export interface UploadConfig {
  token: string;
  apiKey: string;
  appId: string;
  /** True: this app is its own upload service. False: the hosted service is used. */
  isLocal: boolean;
  /** Where files are sent. Undefined with the hosted service: its kit knows the address of its region. */
  ingestUrl: string | undefined;
  /** Where the service tells us that a file has come in. Pinned: taken from a request it could be anybody's. */
  callbackUrl: string;
}

/**
 * Which upload service is used: the environment alone decides.
 * @throws Error when the token is not one, or there is neither a token nor a secret to make one from
 */
export function uploadConfig(env: Env): UploadConfig {
  const origin = new URL(env.NEXTAUTH_URL).origin;
  // An empty line in .env means the same as none.
  const token = env.UPLOADTHING_TOKEN || localUploadToken(env.NEXTAUTH_SECRET ?? "");
  const { apiKey, appId, regions } = readToken(token);
  const isLocal = regions.includes(LOCAL_REGION);
  const ingestUrl = env.UPLOADTHING_INGEST_URL || (isLocal ? `${origin}/api/ingest` : undefined);
  return {
    token,
    apiKey,
    appId,
    isLocal,
    ingestUrl: ingestUrl?.replace(/\/$/, ""),
    callbackUrl: `${origin}/api/uploadthing`,
  };
}

function readToken(token: string) {
  try {
    return tokenSchema.parse(JSON.parse(Buffer.from(token, "base64").toString("utf8")));
  } catch (error) {
    throw new Error("UPLOADTHING_TOKEN is not a token. Copy it again from the upload service, or leave it out.", {
      cause: error,
    });
  }
}
