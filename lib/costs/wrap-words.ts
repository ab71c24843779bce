/**
 * Words broken into lines, since SVG text does not wrap by itself. What does not fit the last line ends in "…".
 * @param most letters a line
 * @param lines lines at the most, 1 or more
 * @example wrapWords("Activator past its day", 13, 3) → ["Activator", "past its day"]
 */
export function wrapWords(text: string, most: number, lines: number): string[] {
  const broken: string[] = [];
  for (const word of text.split(" ")) {
    const last = broken.at(-1);
    if (last !== undefined && `${last} ${word}`.length <= most) broken[broken.length - 1] = `${last} ${word}`;
    else broken.push(word);
  }
  const kept = broken.slice(0, lines);
  const end = kept.at(-1);
  if (end !== undefined && broken.length > lines) kept[kept.length - 1] = `${end.slice(0, Math.max(1, most - 1))}…`;
  return kept;
}
