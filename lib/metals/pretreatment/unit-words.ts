const FIGURE_AND_UNIT = /(\d) (?=(?:°C|%|g\/L|mL\/L|g\/cm³|A\/dm²|µm|MPa|HRC|min|s|h)(?![\w]))/g;

/**
 * The same words with each figure bound to its unit, so that no line ends between them.
 * @example bindUnits("60 to 80 °C") // "60 to 80\u00a0°C"
 */
export function bindUnits(words: string): string {
  return words.replace(FIGURE_AND_UNIT, "$1\u00a0");
}
