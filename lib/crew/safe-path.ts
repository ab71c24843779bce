const HERE = "http://here.invalid";

/**
 * The page to go to after signing in: only ever a path of this site.
 * @param from what the address bar said; anybody may have written it
 * @returns the path with its query, or "/" when it leads elsewhere, to the sign-in page itself or to no page
 * @example safePath("/cases?station=3") === "/cases?station=3"
 * @example safePath("//evil.example") === "/"
 */
export function safePath(from: string | undefined): string {
  if (!from?.startsWith("/")) return "/";
  let url: URL;
  try {
    // The parser sees what a browser would: "//host", "/\host" and hidden tabs all turn into another origin.
    url = new URL(from, HERE);
  } catch {
    return "/";
  }
  if (url.origin !== HERE || url.pathname.startsWith("//")) return "/";
  if (url.pathname === "/sign-in" || url.pathname.startsWith("/api/")) return "/";
  return `${url.pathname}${url.search}${url.hash}`;
}
