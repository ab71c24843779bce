import { ramp } from "../curves";
import { surveyField } from "../survey";
import type { Bed, BedScene } from "./bed";

/** A blue shop cloth: a waffle weave, folds that catch the light, a wet patch. */
export function towel({ noise, random, wet }: BedScene): Bed {
  const turn = random() * 0.8 - 0.4;
  const cos = Math.cos(turn);
  const sin = Math.sin(turn);
  const folds = surveyField(2, 1.6, 16, (x, y) =>
    noise.cloud((x * cos + y * sin) * 0.9 + 2, (y * cos - x * sin) * 2.1, 71, 2),
  );
  const soakedAt = surveyField(2, 1.6, 16, (x, y) => ramp(0.42, 0.66, noise.cloud(x * 0.8, y * 0.8, 76, 3)));
  return ({ x, y, down }, colour) => {
    const u = x * cos + y * sin;
    const v = y * cos - x * sin;
    const pull = noise.value(x * 2.4, y * 2.4, 70) * 1.6;
    const weave = Math.sin(u * 84 + pull) * Math.sin(v * 84 + pull);
    const fold = folds(x, y);
    const lint = noise.value(x * 60, y * 60, 75);
    const soaked = wet ? soakedAt(x, y) : 0;
    const level = (0.66 + 0.2 * weave + 0.1 * lint + 1.1 * (fold - 0.5)) * (1.1 - 0.25 * down) * (1 - 0.42 * soaked);
    colour.red = 0.075 * level;
    colour.green = 0.17 * level;
    colour.blue = 0.31 * level;
    colour.mirror = 0.04;
  };
}
