import type { BaseMetal } from "./case-words";
import { counted, metalInside } from "./part-words";

/** What of a job its later prices rest on. */
export interface JobCostFacts {
  quantity: number;
  areaDm2: number;
  /** 0: nobody has filled it in. */
  partValueCents: number;
  finalStack: readonly { metal: string; thicknessUm: number }[];
}

/**
 * The layers after the strike, from the strike out.
 * @example layersWords([{ metal: "Ni", thicknessUm: 5 }, { metal: "Au", thicknessUm: 0.8 }]) === "Ni 5 µm, Au 0.8 µm"
 */
export function layersWords(layers: JobCostFacts["finalStack"]): string {
  if (layers.length === 0) return "the strike alone";
  return layers.map((layer) => `${layer.metal} ${layer.thicknessUm} µm`).join(", ");
}

/**
 * What differs between a job before and after, one phrase a fact; empty when nothing does.
 * @param money writes an amount in the shop's currency
 */
export function jobChanges(before: JobCostFacts, after: JobCostFacts, money: (cents: number) => string): string[] {
  const value = (cents: number) => (cents === 0 ? "not set" : money(cents));
  const facts: [string, string, string][] = [
    ["quantity", counted(before.quantity, "part"), counted(after.quantity, "part")],
    ["area", `${before.areaDm2} dm²`, `${after.areaDm2} dm²`],
    ["value of a part", value(before.partValueCents), value(after.partValueCents)],
    ["layers", layersWords(before.finalStack), layersWords(after.finalStack)],
  ];
  return facts.flatMap(([name, from, to]) => (from === to ? [] : [`${name} from ${from} to ${to}`]));
}

/** The same for what its parts are made of. */
export function metalChanges(before: JobMetal, after: JobMetal): string[] {
  const from = metalInside(before.baseMetal, before.alloy);
  const to = metalInside(after.baseMetal, after.alloy);
  return from === to ? [] : [`base metal from ${from} to ${to}`];
}

/** What a job card says its parts are made of. */
export interface JobMetal {
  baseMetal: BaseMetal;
  alloy: string | null;
}
