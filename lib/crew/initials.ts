/**
 * Two letters that stand for a person on a round mark.
 * @example initialsOf("Ines Varga") === "IV"
 */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/).filter(Boolean);
  const letters = words.length > 1 ? [words[0], words.at(-1)] : [words[0]];
  return letters.map((word) => word?.charAt(0).toUpperCase() ?? "").join("") || "?";
}

/**
 * A name short enough for a list: first name and the last one's letter.
 * @example shortName("Tobias Lindqvist") === "Tobias L"
 */
export function shortName(name: string): string {
  const words = name.trim().split(/\s+/);
  const last = words.length > 1 ? words.at(-1)?.charAt(0) : undefined;
  return last ? `${words[0]} ${last}` : (words[0] ?? "");
}
