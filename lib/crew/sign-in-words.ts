import { tryAgainWords } from "./try-again";

/** The same for a wrong password, an unknown e-mail and a removed member: it tells a stranger nothing. */
export const SIGN_IN_WRONG = "E-mail or password is wrong.";

const TOO_MANY = /^too-many:(\d{1,9})$/;

/** What the sign-in sends through next-auth, which carries one short text and no more. */
export function tooManyCode(waitMs: number): string {
  return `too-many:${Math.ceil(waitMs)}`;
}

/**
 * The sentence for what next-auth answers. It may come from the address bar, so only known codes become words.
 * @param code the `error` of the answer; "CredentialsSignin" is next-auth's own word for a refusal
 */
export function signInWords(code: string): string {
  if (code === "CredentialsSignin") return SIGN_IN_WRONG;
  const wait = TOO_MANY.exec(code)?.[1];
  if (wait !== undefined) return `Too many tries. Try again ${tryAgainWords(Number(wait))}.`;
  return "Sign-in broke on our side. Try again in a minute.";
}
