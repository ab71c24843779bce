import "server-only";
import { cookies } from "next/headers";

/** next-auth's cookie, whole or in numbered pieces, with the prefix that it bears under https. */
const SESSION_COOKIE = /^(__Secure-)?next-auth\.session-token(\.\d+)?$/;

/** Takes the session away from this browser. Other devices stay signed in. */
export async function forgetSession(): Promise<void> {
  const jar = await cookies();
  for (const { name } of jar.getAll()) {
    if (SESSION_COOKIE.test(name)) jar.delete({ name, path: "/", secure: name.startsWith("__Secure-") });
  }
}
