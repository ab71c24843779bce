export type Theme = "day" | "night";

/** What the `theme` cookie says; undefined leaves it to the system. */
export function readTheme(cookie: string | undefined): Theme | undefined {
  return cookie === "day" || cookie === "night" ? cookie : undefined;
}
