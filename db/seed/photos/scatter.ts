/** A round mark on the part. `kind` in 0..1 lets a fault vary its marks. */
export type Disc = { x: number; y: number; radius: number; kind: number };

const CELLS = 40;
const SPAN = 1.6;

/** Which discs can matter at a point: a grid of short lists, so that a pixel never walks all marks. */
export type Scatter = (x: number, y: number) => readonly Disc[];

/** `margin` is how far beyond its radius a disc still shows. */
export function scatter(discs: readonly Disc[], margin: number): Scatter {
  const cells: Disc[][] = Array.from({ length: CELLS * CELLS }, () => []);
  const side = (2 * SPAN) / CELLS;
  const cellOf = (at: number) => Math.floor((at + SPAN) / side);
  const none: readonly Disc[] = [];
  for (const disc of discs) {
    const reach = disc.radius + margin;
    const lastRow = Math.min(CELLS - 1, cellOf(disc.y + reach));
    const lastColumn = Math.min(CELLS - 1, cellOf(disc.x + reach));
    for (let row = Math.max(0, cellOf(disc.y - reach)); row <= lastRow; row++) {
      for (let column = Math.max(0, cellOf(disc.x - reach)); column <= lastColumn; column++) {
        cells[row * CELLS + column]?.push(disc);
      }
    }
  }
  return (x, y) => {
    const column = cellOf(x);
    const row = cellOf(y);
    if (column < 0 || row < 0 || column >= CELLS || row >= CELLS) return none;
    return cells[row * CELLS + column] ?? none;
  };
}
