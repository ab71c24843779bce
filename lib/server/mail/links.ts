import { readEnv } from "@/lib/env";

/** A path of the app as a whole address, for a mail that is read elsewhere. */
export function wholeLink(path: string, base: string = readEnv().NEXTAUTH_URL): string {
  return new URL(path, base).href;
}
