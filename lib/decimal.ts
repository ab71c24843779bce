/** At most nine digits before the mark and four after it. A comma before three digits could be either, so it is neither. */
const DECIMAL = /^\d{1,9}(?:\.\d{1,4}|,(?!\d{3}$)\d{1,4})?$/;

/** A typed decimal number, with a point or a comma; undefined when it is none. */
export function readDecimal(typed: string): number | undefined {
  return DECIMAL.test(typed) ? Number(typed.replace(",", ".")) : undefined;
}

/** Said beside a field that holds something else. */
export const NOT_A_NUMBER = "Write a number such as 4 or 4.5, without spaces or a thousands mark.";

/**
 * A figure as it stands in a field: at most four decimals, no thousands mark, so that `readDecimal` reads it back.
 * @example decimalText(0.62) === "0.62"; decimalText(1 / 3) === "0.3333"
 */
export function decimalText(figure: number): string {
  return String(Number(figure.toFixed(4)));
}
