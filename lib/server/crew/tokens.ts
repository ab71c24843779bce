import { createHash, randomBytes } from "node:crypto";

/** A secret for a link: 32 random bytes. Only its hash is stored, so a stolen database opens no link. */
export function newToken(): { token: string; tokenHash: string } {
  const token = randomBytes(32).toString("base64url");
  return { token, tokenHash: hashToken(token) };
}

/** SHA-256 as hex. A plain hash will do: the token has 256 random bits, there is nothing to guess from. */
export function hashToken(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}
