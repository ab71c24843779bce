import "server-only";
import type { AuthOptions, User } from "next-auth";
import CredentialsProvider from "next-auth/providers/credentials";
import { getDb } from "@/db/client";
import { signInInput } from "@/lib/crew/crew.schema";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { tooManyCode } from "@/lib/crew/sign-in-words";
import { readEnv } from "@/lib/env";
import { routes } from "@/lib/routes";
import { addressOf, watchPeers } from "./address";
import { trySignIn } from "./crew/sign-in";
import { faultOf } from "./faults";

const env = readEnv();
watchPeers();

/** E-mail and password, kept in a signed cookie. What a member may do is never in it: `currentMember` reads that. */
export const authOptions: AuthOptions = {
  secret: env.NEXTAUTH_SECRET,
  session: { strategy: "jwt", maxAge: CREW_LIMITS.sessionMs / 1000 },
  pages: { signIn: routes.signIn(), error: routes.signIn(), signOut: routes.account() },
  providers: [
    CredentialsProvider({
      credentials: { email: { type: "email" }, password: { type: "password" } },
      authorize: (typedIn, request) => authorize(typedIn, request.headers ?? {}),
    }),
  ],
  callbacks: {
    jwt: ({ token, user }) =>
      // `user` is there only at the sign-in itself.
      user ? { sub: user.id, memberId: user.memberId, sessionVersion: user.sessionVersion } : token,
    session: ({ session, token }) => ({
      expires: session.expires,
      memberId: token.memberId,
      sessionVersion: token.sessionVersion,
    }),
  },
};

/** Null is a refusal. next-auth passes the text of a thrown error on to the browser, so it holds a code and no more. */
async function authorize(typedIn: unknown, headers: Record<string, unknown>): Promise<User | null> {
  const input = signInInput.safeParse(typedIn);
  if (!input.success) return null;
  const header = (name: string) => (typeof headers[name] === "string" ? headers[name] : null);
  const address = addressOf(header, env.TRUST_PROXY === "1");
  const answer = await trySignIn(getDb(), { ...input.data, address, now: Date.now() }).catch((error: unknown) => {
    faultOf(error, "sign-in");
    throw new Error("broken");
  });
  if (answer.kind === "too-many") throw new Error(tooManyCode(answer.waitMs));
  if (answer.kind === "wrong") return null;
  return { id: String(answer.memberId), memberId: answer.memberId, sessionVersion: answer.sessionVersion };
}
