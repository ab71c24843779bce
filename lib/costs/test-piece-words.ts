import { shareWords } from "@/lib/costs/share-words";
import { piecesForChance, testPieceSaving } from "@/lib/costs/test-pieces";
import { NOT_A_NUMBER, readDecimal } from "@/lib/decimal";
import { InputError } from "@/lib/input-error";
import { formatMoney } from "@/lib/money";

/** The figures as they are typed: shares in percent, money in whole units of the currency. */
export interface TypedTestPieces {
  /** Share of the parts that the fault spoils. */
  badPercent: string;
  /** Wanted chance that a piece shows it. */
  wantedPercent: string;
  /** What one piece costs. */
  pieceMoney: string;
  /** Share of runs that start with such a fault. */
  faultyRunPercent: string;
  /** What such a run costs when nobody notices before it. */
  spoiltRunMoney: string;
}
export type TestPieceField = keyof TypedTestPieces;

export type TestPieceReading =
  | { ok: true; pieces: number; headline: string; chance: string; money: string }
  | { ok: false; faults: Partial<Record<TestPieceField, string>>; waitsFor: string };

const WAITS_FOR: Record<TestPieceField, string> = {
  badPercent: "the share of parts that the fault spoils",
  wantedPercent: "the wanted chance",
  pieceMoney: "the price of a piece",
  faultyRunPercent: "the share of runs",
  spoiltRunMoney: "the cost of a spoilt run",
};
const MOST_MONEY = 1e9;

/**
 * How many test pieces to strike before a run, and whether they pay, in sentences; or which fields hold no usable figure,
 * each with what is wrong with it. Never throws for what is typed.
 */
export function readTestPieces(typed: TypedTestPieces, currency: string): TestPieceReading {
  const faults: Partial<Record<TestPieceField, string>> = {};
  const read = (field: TestPieceField, fits: (figure: number) => boolean, words: string): number => {
    const figure = readDecimal(typed[field].trim());
    if (figure === undefined) faults[field] = NOT_A_NUMBER;
    else if (!fits(figure)) faults[field] = words;
    return figure ?? 0;
  };
  const isMoney = (figure: number) => figure <= MOST_MONEY;
  const dear = "That is more than can be counted here.";
  const badShare = read("badPercent", (of) => of > 0 && of <= 100, "Write a share above 0, at most 100.") / 100;
  const wanted =
    read(
      "wantedPercent",
      (of) => of > 0 && of < 100,
      "Write a chance above 0 and below 100. No number of pieces makes it certain.",
    ) / 100;
  const pieceCents = read("pieceMoney", isMoney, dear) * 100;
  const faultyRunShare = read("faultyRunPercent", (of) => of <= 100, "Write a share from 0 to 100.") / 100;
  const spoiltRunCents = read("spoiltRunMoney", isMoney, dear) * 100;
  if (Object.keys(faults).length > 0) return refused(faults);
  try {
    const pieces = piecesForChance(badShare, wanted);
    const saving = testPieceSaving({ badShare, pieces, pieceCents, faultyRunShare, spoiltRunCents });
    return { ok: true, ...answerWords({ badShare, pieces, faultyRunShare, currency, ...saving }) };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return refused({ badPercent: error.problem });
  }
}

function refused(faults: Partial<Record<TestPieceField, string>>): TestPieceReading {
  const fields = Object.keys(WAITS_FOR).filter((field): field is TestPieceField => field in faults);
  return { ok: false, faults, waitsFor: `Waits for ${fields.map((field) => WAITS_FOR[field]).join(", ")}.` };
}

interface Answer {
  badShare: number;
  pieces: number;
  faultyRunShare: number;
  currency: string;
  chance: number;
  piecesCents: number;
  savedCents: number;
  netCents: number;
}

function answerWords(answer: Answer) {
  const { pieces, badShare, faultyRunShare, currency, chance, piecesCents, savedCents, netCents } = answer;
  const count = pieces.toLocaleString("en-US");
  const noun = pieces === 1 ? "test piece" : "test pieces";
  const money = (cents: number) => formatMoney(cents, currency);
  const saves = `They cost ${money(piecesCents)} a run and save ${money(savedCents)}, over all runs, when ${shareWords(faultyRunShare)} of them start so.`;
  return {
    pieces,
    headline: netCents > 0 ? `Strike ${count} ${noun} first.` : `${count} ${noun} would not pay.`,
    chance: `${count} ${noun}: ${chanceWords(chance)} chance that at least one shows a fault that spoils ${shareWords(badShare)} of the parts.`,
    money: `${saves} ${netWords(netCents, money)}`,
  };
}

function netWords(netCents: number, money: (cents: number) => string): string {
  if (netCents > 0) return `That leaves ${money(netCents)} a run.`;
  if (netCents === 0) return "It comes out even.";
  return `They cost ${money(-netCents)} a run more than they save.`;
}

/** A chance near certainty is not certainty. @example chanceWords(0.9995) === "a 99.9%" */
function chanceWords(chance: number): string {
  const tenths = Math.floor(chance * 1000) / 10;
  return tenths >= 95 ? `a ${tenths}%` : `a ${Math.round(chance * 100)}%`;
}
