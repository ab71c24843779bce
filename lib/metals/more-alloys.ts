import type { Material } from "@/lib/metals/material";

/** What is needed to compare a declared alloy with a weighing. */
export type AlloyRange = Pick<Material, "baseMetal" | "lowGPerCm3" | "highGPerCm3" | "source" | "alloys">;

const fromMemory = (
  baseMetal: AlloyRange["baseMetal"],
  [lowGPerCm3, highGPerCm3]: [number, number],
  alloys: readonly string[],
): AlloyRange => ({ baseMetal, lowGPerCm3, highGPerCm3, source: "data sheets, from memory", alloys });

/**
 * Alloys that job cards name and that lie at the edge of their base metal or outside what the table of densities holds,
 * so that a true declaration is not called false. Never candidates. All from memory.
 */
export const MORE_ALLOYS: readonly AlloyRange[] = [
  fromMemory("steel", [7.66, 7.75], ["D2"]),
  fromMemory("steel", [7.78, 7.87], ["O1", "A2", "tool steel"]),
  fromMemory("stainless", [7.62, 7.8], ["440C", "420"]),
  fromMemory("stainless", [7.74, 7.84], ["17-4", "17-4PH"]),
  fromMemory("stainless", [7.9, 8.03], ["301", "302", "303"]),
  fromMemory("brass", [8.77, 8.83], ["C220", "C22000"]),
  fromMemory("brass", [8.72, 8.78], ["C230", "C23000", "red brass"]),
  fromMemory("brass", [8.38, 8.44], ["C464", "C46400", "naval brass"]),
  fromMemory("bronze", [7.42, 7.6], ["C954", "C95400", "C630", "C63000"]),
  fromMemory("bronze", [8.85, 8.96], ["C932", "C93200", "bearing bronze"]),
  fromMemory("nickel", [8.15, 8.55], ["Inconel"]),
  fromMemory("nickel", [8.3, 8.4], ["Kovar"]),
  fromMemory("nickel", [8.05, 8.2], ["Invar"]),
  fromMemory("aluminium", [2.76, 2.8], ["2024"]),
  fromMemory("aluminium", [2.79, 2.83], ["7075"]),
  fromMemory("silver", [10.25, 10.4], ["coin silver", "900"]),
];
