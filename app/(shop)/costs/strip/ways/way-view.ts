import type { StripBathView } from "@/components/costs/strip-bath-fields";
import type { StripMetalView } from "@/components/costs/strip-metals";
import type { StripWayView } from "@/components/costs/strip-way";
import type { ThreeFieldsView } from "@/components/costs/three-fields";
import { BASE_METAL_TITLES } from "@/lib/cases/case-words";
import type { ThreePoint } from "@/lib/costs/pert";
import { currencySign } from "@/lib/costs/rate-fields";
import { CAUTION_KEYS, CAUTIONS, type CautionKey } from "@/lib/costs/strip-cautions";
import { STRIP_METHOD_TITLES, type DissolvingRow, type PolishingRow, type StripRow } from "@/lib/costs/strip-methods";
import { solutionPriceWords, threePointWords } from "@/lib/costs/strip-row-changes";
import { shippedCautions } from "@/lib/costs/strip-row-edit";
import { isFromMemory, NAMED_BASE_METALS, standingOn } from "@/lib/costs/strip-row-fields";
import { decimalText } from "@/lib/decimal";
import { routes } from "@/lib/routes";

const MEMORY = "from memory";

/** "Polish back", or what is in the bath. */
export const wayTitle = (row: StripRow) =>
  row.method === "polish-back" ? STRIP_METHOD_TITLES["polish-back"] : row.solution;

export function wayMeta(row: StripRow): string {
  if (row.method === "polish-back") return "By hand or wheel, any deposit on any base metal";
  const [from, to] = row.bathTempC;
  const temperature = from === to ? `${from} °C` : `${from} to ${to} °C`;
  return [STRIP_METHOD_TITLES[row.method], temperature, row.current].filter(Boolean).join(", ");
}

/** The highest rate among these, for one scale. */
export const mostOf = (rows: readonly StripRow[]) =>
  Math.max(...rows.map((row) => (row.method === "polish-back" ? row.minutesPerDm2Um : row.rateUmPerMin).high));

/** A way as the list shows it. */
export function wayView(row: StripRow, rateMost: number, currency: string): StripWayView {
  const base = {
    slug: row.id,
    title: wayTitle(row),
    meta: wayMeta(row),
    rateMost,
    cautions: row.cautions.map((key) => CAUTIONS[key]),
    changeHref: routes.stripWays({ way: row.id }),
  };
  return row.method === "polish-back" ? { ...base, ...polishView(row) } : { ...base, ...bathView(row, currency) };
}

type Rest = Omit<StripWayView, "slug" | "title" | "meta" | "rateMost" | "cautions" | "changeHref">;

function polishView(row: PolishingRow): Rest {
  return {
    rate: rateView(row.minutesPerDm2Um, "min per dm² and µm of soft copper; harder deposits take longer in proportion"),
    holding: null,
    price: null,
    safeOn: "Every base metal",
    attacks: [],
    nobody: "",
    sources: [sourceView("All of it", row.source)],
    isMemory: isFromMemory(row.source),
  };
}

function bathView(row: DissolvingRow, currency: string): Rest {
  const metals = NAMED_BASE_METALS.map((metal) => ({ title: BASE_METAL_TITLES[metal], ...standingOn(row, metal) }));
  const safe = metals.filter((metal) => metal.standing === "safe");
  const unknown = metals.filter((metal) => metal.standing === "unknown");
  const holding = row.holdingSource ?? MEMORY;
  return {
    rate: rateView(row.rateUmPerMin, "µm/min"),
    holding: threePointWords(row.holdingGPerL, "g"),
    price: solutionPriceWords(row.solutionCentsPerL, currency),
    safeOn:
      safe
        .map(({ title, reason }, index) => `${index === 0 ? title : title.toLowerCase()}${reason && ` (${reason})`}`)
        .join(", ") || "None: it is never offered",
    attacks: metals
      .filter((metal) => metal.standing === "attacks")
      .map(({ title, reason }) => ({ metal: title, reason })),
    nobody: unknown.map(({ title }, index) => (index === 0 ? title : title.toLowerCase())).join(", "),
    sources: [
      sourceView("Solution and base metals", row.source),
      sourceView("Rate", row.rateSource),
      sourceView("What a litre holds", holding),
    ],
    isMemory: isFromMemory(row.rateSource),
  };
}

function rateView(rate: ThreePoint, unit: string): StripWayView["rate"] {
  const { low, likely, high } = rate;
  return { ...rate, words: { low: decimalText(low), likely: decimalText(likely), high: decimalText(high) }, unit };
}

const sourceView = (of: string, words: string) => ({ of, words, isMemory: isFromMemory(words) });

const NO_FIGURES: ThreeFieldsView["values"] = ["", "", ""];

/** The fields of a bath: as it stands, or (null) empty for a new one. */
export function bathFields(row: DissolvingRow | null, currency: string): StripBathView {
  const shipped = row ? shippedCautions(row.id) : [];
  const price = row?.solutionCentsPerL;
  return {
    rate: { name: "rate", label: "Rate", unit: "µm/min", ...figuresOf(row?.rateUmPerMin, "µm/min") },
    holding: { name: "holding", label: "Metal that a litre holds", unit: "g", ...figuresOf(row?.holdingGPerL, "g") },
    price: price === undefined ? "" : decimalText(price / 100),
    priceNow: price === undefined ? undefined : solutionPriceWords(price, currency),
    priceUnit: `${currencySign(currency)} / L`,
    metals: NAMED_BASE_METALS.map((metal): StripMetalView => {
      const stands = row ? standingOn(row, metal) : ({ standing: "unknown", reason: "" } as const);
      return { metal, label: BASE_METAL_TITLES[metal], ...stands };
    }),
    cautions: CAUTION_KEYS.filter((key) => key !== ALWAYS).map((key) => ({
      key,
      ...CAUTIONS[key],
      chosen: row?.cautions.includes(key) ?? false,
      fixed: shipped.includes(key),
    })),
    source: row?.source ?? "",
    rateSource: row?.rateSource ?? "",
  };
}

/** Stands under every estimate anyway. */
const ALWAYS: CautionKey = "sheetAndPermits";

/** The fields of polishing by hand. */
export function polishFields(row: PolishingRow): { rate: ThreeFieldsView; source: string } {
  const unit = "min per dm² and µm";
  return {
    rate: {
      name: "rate",
      label: "Polishing time",
      unit,
      note: "Of soft copper, 100 HV. Harder deposits take longer in proportion.",
      ...figuresOf(row.minutesPerDm2Um, unit),
    },
    source: row.source,
  };
}

function figuresOf(figure: ThreePoint | undefined, unit: string): Pick<ThreeFieldsView, "now" | "values"> {
  if (!figure) return { values: NO_FIGURES };
  return {
    now: threePointWords(figure, unit),
    values: [decimalText(figure.low), decimalText(figure.likely), decimalText(figure.high)],
  };
}
