import { ramp } from "../curves";
import type { Fault } from "../surface";

/** An even pink strike. Only what every good part has: a trace thinner in the contact, a shade warmer at the edge. */
export const sound: Fault = ({ shape, noise }) => {
  return (point, surface) => {
    const contact = ramp(0.03, 0, shape.recess(point.x, point.y));
    surface.copper -= contact * 0.12;
    const rim = ramp(-0.1, 0, point.edge) * noise.value(point.x * 3, point.y * 3, 100);
    surface.red *= 1 + 0.04 * rim;
    surface.blue *= 1 - 0.04 * rim;
  };
};
