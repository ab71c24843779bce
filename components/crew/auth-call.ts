/**
 * Asks next-auth to sign this browser in. Two calls, so that the page need not load its client library.
 * @returns null when signed in, else next-auth's code for what was wrong
 * @throws TypeError when the server cannot be reached
 */
export async function askSignIn(email: string, password: string): Promise<string | null> {
  const tokenAnswer = await fetch("/api/auth/csrf", { cache: "no-store" });
  const { csrfToken } = (await tokenAnswer.json()) as { csrfToken: string }; // next-auth's own shape
  const answer = await fetch("/api/auth/callback/credentials", {
    method: "POST",
    body: new URLSearchParams({ csrfToken, email, password, json: "true" }),
  });
  const { url } = (await answer.json()) as { url?: string }; // next-auth's own shape
  const code = url ? new URL(url, window.location.origin).searchParams.get("error") : null;
  return answer.ok && code === null ? null : (code ?? "broken");
}
