/** Long class names part at their joint, where a picture button on a phone is too narrow for them. */
const JOINT = /^(Under|Over)(?=activation)/;
const SOFT_HYPHEN = "\u00ad";

/** @example classWords("Underactivation") shows "Under-" and "activation" where it has to break, else one word */
export function classWords(title: string): string {
  return title.replace(JOINT, `$1${SOFT_HYPHEN}`);
}
