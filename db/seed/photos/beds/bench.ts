import { bell, ramp } from "../curves";
import { surveyField } from "../survey";
import type { Bed, BedScene } from "./bed";

/** A worn rubber mat on the bench: charcoal, ribbed, chalky scuffs and a wet sheen. */
export function bench({ noise, random, wet }: BedScene): Bed {
  const turn = (random() - 0.5) * 0.5;
  const cos = Math.cos(turn);
  const sin = Math.sin(turn);
  const scratch = random() * 2 - 1;
  const wornAt = surveyField(2, 1.6, 40, (x, y) => 0.034 * ramp(0.35, 0.75, noise.cloud(x * 1.4, y * 1.4, 81, 4)));
  const chalkAt = surveyField(2, 1.6, 40, (x, y) => 0.035 * ramp(0.6, 0.85, noise.cloud(x * 6, y * 3, 85, 4)));
  const sheenAt = surveyField(2, 1.6, 24, (x, y) => ramp(0.46, 0.7, noise.cloud(x * 1.1 + 4, y * 1.1, 88, 3)));
  return ({ x, y, down }, colour) => {
    const v = y * cos - x * sin;
    const rib = Math.abs(Math.sin(v * 30));
    const grain = noise.value(x * 70, y * 70, 80);
    const worn = wornAt(x, y);
    const chalk = chalkAt(x, y);
    const cutLine = bell(x * 0.7 + y - scratch, 0.006) * 0.05;
    const sheen = wet ? sheenAt(x, y) : 0;
    const level = 0.05 + 0.022 * rib + 0.018 * grain + worn + chalk + cutLine + sheen * (0.05 - 0.03 * rib);
    const lit = level * (1.25 - 0.4 * down);
    colour.red = lit * 1.03;
    colour.green = lit * 1.01;
    colour.blue = lit;
    colour.mirror = 0.05 + 0.2 * sheen;
  };
}
