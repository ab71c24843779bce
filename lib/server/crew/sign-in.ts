import { randomBytes } from "node:crypto";
import type { Db } from "@/db/open";
import { getCredentials } from "@/db/queries/crew";
import { forgiveTries, takeTry } from "@/db/queries/sign-in-attempts";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { hashPassword, verifyPassword } from "../passwords";

/** Made at start, so that an e-mail that nobody has takes as long to refuse as a wrong password. */
const dummyHash = hashPassword(randomBytes(24).toString("base64"));

export type SignInAnswer =
  { kind: "in"; memberId: number; sessionVersion: number } | { kind: "wrong" } | { kind: "too-many"; waitMs: number };

interface SignInTry {
  /** Lower case, as `signInInput` leaves it. */
  email: string;
  password: string;
  /** Where the try comes from, as `addressOf` says. */
  address: string;
  now: number;
}

/**
 * One try at signing in. It is counted before the password is looked at, by e-mail whether that exists or not; a try
 * that turns out right is forgiven, and with it the earlier slips of that e-mail.
 */
export async function trySignIn(db: Db, { email, password, address, now }: SignInTry): Promise<SignInAnswer> {
  const keys = [
    { key: emailKey(email), most: CREW_LIMITS.signInTriesPerEmail },
    { key: `i:${address}`, most: CREW_LIMITS.signInTriesPerAddress },
  ];
  const taken = db.transaction((tx) => takeTry(tx, keys, CREW_LIMITS.signInWindowMs, now), { behavior: "immediate" });
  if (!taken.ok) return { kind: "too-many", waitMs: taken.waitMs };
  const credentials = getCredentials(db, email);
  const isRight = await verifyPassword(credentials?.passwordHash ?? (await dummyHash), password);
  if (!credentials || !isRight) return { kind: "wrong" };
  forgiveTries(db, taken.tryIds, emailKey(email));
  return { kind: "in", memberId: credentials.memberId, sessionVersion: credentials.sessionVersion };
}

/** The key under which tries against an e-mail are counted. */
export function emailKey(email: string): string {
  return `e:${email}`;
}
