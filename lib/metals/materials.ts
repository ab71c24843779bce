import type { Material } from "@/lib/metals/material";
import { COPPER_AND_NICKEL } from "@/lib/metals/table/copper-and-nickel";
import { IRON_AND_STEEL } from "@/lib/metals/table/iron-and-steel";
import { PRECIOUS_METALS } from "@/lib/metals/table/precious-metals";
import { ZINC_AND_LIGHT_METALS } from "@/lib/metals/table/zinc-and-light-metals";

export type { Material } from "@/lib/metals/material";

/** Magnet and colour stand in no table of densities. */
export const MAGNET_SOURCE = "Magnet and colour: general metallurgy, from memory";

/** Every solid metal whose density is known here, 47 of them. */
export const MATERIALS: readonly Material[] = [
  ...IRON_AND_STEEL,
  ...COPPER_AND_NICKEL,
  ...ZINC_AND_LIGHT_METALS,
  ...PRECIOUS_METALS,
];
