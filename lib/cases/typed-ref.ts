import { formatCaseRef } from "./case-ref";

/** What somebody meant who typed a reference: the whole of it, or only its running number. */
export type TypedRef = { ref: string } | { runningNumber: string };

const WHOLE = /^(?:ct)?[\s._/-]*(\d{4})[\s._/-]+(\d{1,7})$/i;
const RUN_TOGETHER = /^ct[\s._/-]*(\d{4})(\d{4,7})$/i;
const NUMBER = /^(?:ct[\s._/-]*|#\s*|no\.?\s*)?(\d{1,7})$/i;

/**
 * Reads a case's reference in the ways in which people type it: CT-2607-0042, ct 2607 42, 2607-42, CT26070042, #42, 42.
 * @returns null for a text that is no reference. The running number comes padded as it stands in references
 * @example readTypedRef("2607-42") // { ref: "CT-2607-0042" }
 * @example readTypedRef("42") // { runningNumber: "0042" }
 */
export function readTypedRef(text: string): TypedRef | null {
  const typed = text.trim();
  const whole = WHOLE.exec(typed) ?? RUN_TOGETHER.exec(typed);
  if (whole?.[1] && whole[2]) return { ref: formatCaseRef(whole[1], Number(whole[2])) };
  const number = NUMBER.exec(typed);
  return number?.[1] ? { runningNumber: String(Number(number[1])).padStart(4, "0") } : null;
}
