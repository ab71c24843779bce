import { bell, mix, ramp } from "../curves";
import { weepColour } from "../metals";
import { lay, placeOn, tint, type Fault } from "../surface";

/** Solution trapped in a seam or pore creeps out after the strike: a stain that starts at the line and fades away from it. */
export const bleedOut: Fault = (scene) => {
  const { shape, noise, amount, reach, baseMetal } = scene;
  const [red, green, blue] = weepColour(baseMetal);
  const reachOut = (0.26 + 0.4 * amount) * reach;
  const pores = Array.from({ length: 3 }, () => placeOn(scene, 0.03));
  return ({ x, y }, surface) => {
    const away = shape.seam(x, y);
    const line = bell(away, 0.011);
    // Fingers: how far the stain got differs along the seam, not away from it.
    const fingers = noise.cloud(x * 4.2 - y * 0.8, y * 4.2 + x * 0.8, 200, 3);
    const length = reachOut * ramp(0.25, 0.62, noise.cloud(x * 2.3 + 5, y * 2.3, 204, 2)) + 0.07;
    let stain = ramp(-0.018, 0.01, away) * ramp(length, length * 0.15, away + (fingers - 0.5) * 0.32 * reach);
    for (let i = 0; i < pores.length; i++) {
      const pore = pores[i];
      if (!pore) continue;
      const dx = x - pore.x;
      const dy = y - pore.y;
      const own = Math.sqrt(dx * dx * 1.6 + (dy > 0 ? dy * dy * 0.3 : dy * dy * 1.6));
      stain = Math.max(stain, ramp(0.16 * reach, 0.01, own + (fingers - 0.5) * 0.12) * 0.85);
      if (own < 0.014) surface.dark = 0.9;
    }
    const tide = bell(stain - 0.12, 0.09) * (away > 0 ? 0.4 : 0);
    // Brown and strong at the seam; the salt's own colour is left where the stain dried.
    const strong = ramp(0.35, 1, stain);
    lay(
      surface,
      mix(red, 0.13, strong),
      mix(green, 0.07, strong),
      mix(blue, 0.04, strong),
      Math.min(0.9, stain * 0.84 + tide * 0.5),
    );
    tint(surface, 0.5, 0.3, 0.19, ramp(0, 0.3, stain) * 0.5);
    surface.dark = Math.max(surface.dark, line * 0.88);
    surface.gloss *= 1 - 0.6 * stain;
  };
};
