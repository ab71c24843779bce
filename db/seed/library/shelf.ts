/**
 * The shelf that ships with the product: every class part gathered, each cause and fix once. Fixes that serve several
 * classes (a base metal's route, a bath, a tool, a strip) stand after those of the classes, so that a class's first fix
 * is its plain rework.
 */
import type { Shelf, ShelfPart } from "@/lib/library/library-entry";
import { cautions } from "@/db/seed/library/cautions";
import { bleedOut } from "@/db/seed/library/classes/bleed-out";
import { burning } from "@/db/seed/library/classes/burning";
import { dewetting } from "@/db/seed/library/classes/dewetting";
import { handling } from "@/db/seed/library/classes/handling";
import { immersionDeposit } from "@/db/seed/library/classes/immersion-deposit";
import { noDeposit } from "@/db/seed/library/classes/no-deposit";
import { overactivation } from "@/db/seed/library/classes/overactivation";
import { oxidation } from "@/db/seed/library/classes/oxidation";
import { peeling } from "@/db/seed/library/classes/peeling";
import { pitting } from "@/db/seed/library/classes/pitting";
import { sound } from "@/db/seed/library/classes/sound";
import { underactivation } from "@/db/seed/library/classes/underactivation";
import { waterSpots } from "@/db/seed/library/classes/water-spots";
import { fixesAfterFinalPlate } from "@/db/seed/library/fixes/after-final-plate";
import { fixesByBaseMetal } from "@/db/seed/library/fixes/by-base-metal";
import { fixesOfTools } from "@/db/seed/library/fixes/brush-and-racks";
import { fixesOfBaths } from "@/db/seed/library/fixes/strike-bath";
import { sources } from "@/db/seed/library/sources";

const parts: ShelfPart[] = [
  dewetting,
  underactivation,
  overactivation,
  waterSpots,
  oxidation,
  burning,
  noDeposit,
  peeling,
  immersionDeposit,
  bleedOut,
  pitting,
  handling,
  sound,
];

export const shelf: Shelf = {
  classes: parts.map((part) => part.class),
  causes: parts.flatMap((part) => part.causes),
  fixes: [
    ...parts.flatMap((part) => part.fixes),
    ...fixesByBaseMetal,
    ...fixesOfTools,
    ...fixesOfBaths,
    ...fixesAfterFinalPlate,
  ],
  cautions,
  sources,
};
