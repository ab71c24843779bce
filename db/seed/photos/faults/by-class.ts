import type { ShelfClass } from "@/lib/cases/case-words";
import type { Fault } from "../surface";
import { bleedOut } from "./bleed-out";
import { burning } from "./burning";
import { dewetting } from "./dewetting";
import { handling } from "./handling";
import { immersionDeposit } from "./immersion-deposit";
import { noDeposit } from "./no-deposit";
import { overactivation } from "./overactivation";
import { oxidation } from "./oxidation";
import { peeling } from "./peeling";
import { pitting } from "./pitting";
import { sound } from "./sound";
import { underactivation } from "./underactivation";
import { waterSpots } from "./water-spots";

/** A new class on the shelf does not compile until it can be drawn. */
export const FAULTS: Record<ShelfClass, Fault> = {
  dewetting,
  underactivation,
  overactivation,
  "water-spots": waterSpots,
  oxidation,
  burning,
  "no-deposit": noDeposit,
  peeling,
  "immersion-deposit": immersionDeposit,
  "bleed-out": bleedOut,
  pitting,
  handling,
  sound,
};
