import { InputError, requireBetween, requirePositive, requireWhole } from "@/lib/input-error";

/** Pieces beyond which nobody strikes test pieces. */
export const MOST_PIECES = 1_000_000;

export const TEST_PIECES_SOURCE = "success-run theorem, 1 − (1 − share)^pieces";

/**
 * Chance that at least one of so many test pieces shows a process fault that spoils a share of the parts: 1 − (1 − share)^pieces.
 * Share 0 to 1, pieces 0 or more. Throws `InputError` naming the field. Source: success-run theorem.
 *
 * Example: 5 % bad, 59 pieces: 95 %.
 */
export function chanceToShow(badShare: number, pieces: number): number {
  requireBetween("badShare", badShare, 0, 1);
  requireWhole("pieces", pieces, 0, MOST_PIECES);
  // log1p and expm1 keep a share of one in a billion from rounding away.
  return badShare === 1 && pieces > 0 ? 1 : pieces === 0 ? 0 : -Math.expm1(pieces * Math.log1p(-badShare));
}

/**
 * Test pieces needed for a wanted chance of seeing the fault. Share above 0; chance above 0 and below 1 (certainty takes
 * endless pieces). Throws `InputError` naming the field, also when it would take more than a million.
 * Source: success-run theorem, n = ln(1 − chance)/ln(1 − share) rounded up.
 *
 * Example: 10 % bad, 90 % wanted: 22 pieces.
 */
export function piecesForChance(badShare: number, wantedChance: number): number {
  requirePositive("badShare", badShare, 1);
  if (!(wantedChance > 0 && wantedChance < 1)) {
    throw new InputError("wantedChance", "Give a chance above 0 and below 1. No number of pieces makes it certain.");
  }
  if (badShare === 1) return 1;
  const exact = Math.log1p(-wantedChance) / Math.log1p(-badShare);
  if (exact > MOST_PIECES)
    throw new InputError("badShare", "So small a share takes more than a million pieces to see. Give a greater one.");
  const pieces = Math.max(1, Math.ceil(exact));
  // A ratio that is whole but for rounding must not cost a piece more.
  return pieces > 1 && chanceToShow(badShare, pieces - 1) >= wantedChance - 1e-12 ? pieces - 1 : pieces;
}

/** Are test pieces before a run worth it? Money in cents. */
export interface TestPieceInput {
  badShare: number;
  pieces: number;
  /** What one test piece costs: metal, minutes, tape. */
  pieceCents: number;
  /** Share of runs that start with such a fault. */
  faultyRunShare: number;
  /** What a run with the fault costs when nobody notices before it. */
  spoiltRunCents: number;
}

/**
 * Expected saving per run: share of faulty runs × chance to see it × what the spoilt run costs, less the pieces. May be
 * below 0: then the pieces cost more than they save. Rounded once, to whole cents. Throws `InputError` naming the field.
 */
export function testPieceSaving(input: TestPieceInput): {
  chance: number;
  piecesCents: number;
  savedCents: number;
  netCents: number;
} {
  requireBetween("pieceCents", input.pieceCents, 0, 1e12);
  requireBetween("faultyRunShare", input.faultyRunShare, 0, 1);
  requireBetween("spoiltRunCents", input.spoiltRunCents, 0, 1e12);
  const chance = chanceToShow(input.badShare, input.pieces);
  const piecesCents = Math.round(input.pieces * input.pieceCents);
  const savedCents = Math.round(input.faultyRunShare * chance * input.spoiltRunCents);
  return { chance, piecesCents, savedCents, netCents: savedCents - piecesCents };
}
