import { requireBetween } from "@/lib/input-error";
import { centsForMinutes } from "@/lib/money";

/** Looking at one part at the strike: turn it in the light, press the tape on, pull it off. From memory. */
export const USUAL_CHECK_SECONDS = 30;
/** A strip of test tape, in cents of the shop's currency. From memory. */
export const USUAL_TAPE_CENTS = 6;
export const CHECK_LIMITS = { seconds: 3600, tapeCents: 100_000 } as const;

/**
 * What it costs to check one part: the time at the labour rate, and the tape. Cents with their fraction; round when shown.
 * Throws `InputError` naming the field.
 *
 * Example: 30 s at $52.00 an hour and 6 cents of tape: 49.33 cents.
 */
export function checkCents(
  labourCentsPerHour: number,
  seconds: number = USUAL_CHECK_SECONDS,
  tapeCents: number = USUAL_TAPE_CENTS,
): number {
  requireBetween("seconds", seconds, 0, CHECK_LIMITS.seconds);
  requireBetween("tapeCents", tapeCents, 0, CHECK_LIMITS.tapeCents);
  return centsForMinutes(seconds / 60, labourCentsPerHour) + tapeCents;
}
