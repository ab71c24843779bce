import { caseCost, type CaseCostInput } from "@/lib/costs/case-cost";
import type { ReworkInput } from "@/lib/costs/rework-input";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { reworkFigures } from "@/lib/costs/strip-estimate";
import { SHIPPED_STRIP_TABLE } from "@/lib/costs/strip-plan";
import { BASE_METALS, STAGES_FOUND } from "@/lib/cases/case-words";
import { bareCase, bareEstimate } from "./bare-estimate";
import { race } from "./race";

/**
 * What 10,000 cases cost, each worked out for itself by every way that is allowed, against a bare loop over the same
 * arithmetic that checks nothing, says nothing and finds its figures laid out. One run, turn by turn, medians. Exits 1 above 2.
 *   node --conditions=react-server --import tsx tests/bench/estimates.bench.ts
 */
const CASES = 10_000;
const RACES = 7;
const RUNS = 21;
const WARM_UP = 60;
const LIMIT = 2;

const STACKS: ReworkInput["stack"][] = [
  [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 5 },
    { metal: "Au", thicknessUm: 0.8 },
  ],
  [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 12 },
  ],
  [
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Ni", thicknessUm: 4 },
    { metal: "Ag", thicknessUm: 8 },
  ],
  [
    { metal: "Cu", thicknessUm: 1 },
    { metal: "Ni", thicknessUm: 10 },
    { metal: "Cr", thicknessUm: 0.3 },
  ],
  [
    { metal: "Ni", thicknessUm: 0.3 },
    { metal: "Cu", thicknessUm: 0.5 },
    { metal: "Sn", thicknessUm: 8 },
  ],
];

/** What this shop's record says of its minutes. */
const CORRECTIONS = { "polish-back": 1.12, chemical: 0.93, electrolytic: 1.05 };

/** Cases as they come out of the database: each with a stack of its own, rates and strips shared. */
const inputs: ReworkInput[] = Array.from({ length: CASES }, (_, index) => ({
  quantity: 1 + ((index * 7) % 60),
  areaDm2: 0.2 + ((index * 13) % 97) / 20,
  baseMetal: pick(BASE_METALS, index * 3),
  stack: pick(STACKS, index).map((layer) => ({ ...layer, thicknessUm: layer.thicknessUm * (1 + (index % 9) / 10) })),
  stageFound: pick(STAGES_FOUND, Math.floor(index / 5)),
  partValueCents: 500 + ((index * 31) % 9000),
  rates: STARTING_RATES,
  minutesCorrection: CORRECTIONS,
  table: SHIPPED_STRIP_TABLE,
}));
const cases: CaseCostInput[] = inputs.map((input) => ({ ...input, partValueCents: input.partValueCents ?? null }));
const bare = inputs.map((input) => bareCase(input, SHIPPED_STRIP_TABLE));

function requireAt<Each>(list: readonly Each[], index: number): Each {
  const found = list[index];
  if (found === undefined) throw new Error(`nothing at ${index}`);
  return found;
}

function pick<Each>(list: readonly Each[], index: number): Each {
  const found = list[index % list.length];
  if (found === undefined) throw new Error("an empty list");
  return found;
}

let kept = 0;
const everyBare = () => {
  for (const each of bare) kept += bareEstimate(each)?.meanCents ?? 0;
};
const everyEstimate = () => {
  for (const input of inputs) kept += reworkFigures(input).meanCents;
};
const everyCase = () => {
  for (const input of cases) kept += caseCost(input).meanCents;
};

// A race between two that do not agree is none.
for (const [index, input] of inputs.entries()) {
  const ours = reworkFigures(input);
  const flat = bareEstimate(requireAt(bare, index));
  const apart = [
    Math.abs(ours.meanCents - (flat?.meanCents ?? NaN)),
    Math.abs(ours.low90Cents - (flat?.low90Cents ?? NaN)),
    Math.abs(ours.high90Cents - (flat?.high90Cents ?? NaN)),
    Math.abs(ours.minutes.mean - (flat?.minutes.mean ?? NaN)),
    Math.abs(ours.metalWrittenOffG - (flat?.metalWrittenOffG ?? NaN)),
  ];
  if (!apart.every((gap) => gap <= 1)) throw new Error(`Case ${index}: the bare loop has other figures.`);
}

// Long enough that a busy machine has compiled both sides: what is raced is the running, not the compiling.
for (let run = 0; run < WARM_UP; run += 1) for (const task of [everyBare, everyEstimate, everyCase]) task();

/** Several races, and of their ratios the middle one: a machine that is busy elsewhere spoils one of them, not most. */
function report(name: string, ours: () => void): number {
  const races = Array.from({ length: RACES }, () => race(RUNS, ours, everyBare));
  const sorted = races.toSorted((a, b) => a.oursMs / a.bareMs - b.oursMs / b.bareMs);
  const { oursMs, bareMs } = requireAt(sorted, Math.floor(RACES / 2));
  const ratio = oursMs / bareMs;
  const figures = `${oursMs.toFixed(1)} ms, bare loop ${bareMs.toFixed(1)} ms, ratio ${ratio.toFixed(2)}`;
  console.log(`${CASES.toLocaleString("en")} ${name}: ${figures}`);
  return ratio;
}

const ratio = report(`estimates (at most ${LIMIT})`, everyEstimate);
// For information: what a case adds to its estimate, its rounds, its closing and its own lines, is not in the bare loop.
report("cases with an estimate each", everyCase);
if (!Number.isFinite(kept)) throw new Error("The figures are no numbers.");
process.exit(ratio <= LIMIT ? 0 : 1);
