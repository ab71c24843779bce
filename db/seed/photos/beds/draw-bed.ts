import { ramp } from "../curves";
import { distanceAt, type Frame } from "../frame";
import { STRIKE } from "../metals";
import type { PartBed } from "../part-spec";
import type { Bed, BedColour, BedPlace, BedScene } from "./bed";
import { bench } from "./bench";
import { towel } from "./towel";
import { tray } from "./tray";

const BEDS: Record<PartBed, (scene: BedScene) => Bed> = { tray, towel, bench };

/** Draws the bed over the whole photo, with the part's soft shadow and the copper that a bright bed mirrors. */
export function drawBed(frame: Frame, name: PartBed, scene: BedScene): void {
  const { width, height, scalePx, distance, colour } = frame;
  const bed = BEDS[name](scene);
  const at: BedColour = { red: 0.5, green: 0.5, blue: 0.5, mirror: 0.5 };
  const place: BedPlace = { x: 0.5, y: 0.5, down: 0.5 };
  const shadowX = Math.round(0.05 * scalePx);
  const shadowY = Math.round(0.085 * scalePx);
  for (let row = 0; row < height; row++) {
    place.y = (row + 0.5 - height / 2) / scalePx + frame.offsetY;
    place.down = row / height;
    for (let column = 0; column < width; column++) {
      const pixel = row * width + column;
      const away = distance[pixel] ?? 0;
      // The part will cover it.
      if (away < -0.02) continue;
      place.x = (column + 0.5 - width / 2) / scalePx + frame.offsetX;
      bed(place, at);
      const cast = distanceAt(frame, column - shadowX, row - shadowY);
      const lit = (1 - 0.55 * ramp(0.17, -0.1, cast)) * (0.78 + 0.22 * ramp(0, 0.07, away));
      const bounce = away < 0.5 ? at.mirror * Math.exp(-away * 8) * 0.42 * lit : 0;
      colour[pixel * 3] = at.red * lit * (1 - bounce) + STRIKE[0] * bounce * 0.5;
      colour[pixel * 3 + 1] = at.green * lit * (1 - bounce) + STRIKE[1] * bounce * 0.5;
      colour[pixel * 3 + 2] = at.blue * lit * (1 - bounce) + STRIKE[2] * bounce * 0.5;
    }
  }
}
