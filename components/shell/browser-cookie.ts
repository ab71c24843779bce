const YEAR_S = 60 * 60 * 24 * 365;

/** Remembers a choice of this browser for a year. Choices about how the screen looks, nothing secret. */
export function rememberChoice(name: string, value: string): void {
  document.cookie = `${name}=${value}; path=/; max-age=${YEAR_S}; samesite=lax`;
}

/** Whether the browser remembers that choice with that value. */
export function isChosen(name: string, value: string): boolean {
  return document.cookie.split("; ").includes(`${name}=${value}`);
}
