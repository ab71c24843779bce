import type { PartShape } from "../part-spec";
import { bar } from "./bar";
import { bracket } from "./bracket";
import { coupon } from "./coupon";
import { lug } from "./lug";
import { pin } from "./pin";
import { rotor } from "./rotor";
import type { Shape } from "./shape";
import { shell } from "./shell";
import { spoon } from "./spoon";

/** A new part does not compile until its shape is here. */
export const SHAPES: Record<PartShape, Shape> = { coupon, shell, bracket, pin, rotor, bar, lug, spoon };
