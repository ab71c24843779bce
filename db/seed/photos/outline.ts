/** A closed line of points as shares of the photo's width and height, 0 to 1. */
export type Ring = [x: number, y: number][];

const TURNS = [
  [1, 0],
  [0, 1],
  [-1, 0],
  [0, -1],
] as const;

/**
 * The part's outline: the largest outer ring first, then the holes, each walked along pixel corners and thinned to at most `most` points.
 * Rings shorter than 24 pixel sides are dropped as specks. An empty mask gives no rings.
 */
export function outlineRings(mask: Uint8Array, width: number, height: number, most = 160): Ring[] {
  const inside = (x: number, y: number) => x >= 0 && y >= 0 && x < width && y < height && mask[y * width + x] === 1;
  const seen = new Uint8Array((width + 1) * (height + 1));
  const found: { ring: Ring; area: number }[] = [];
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      // A top side of a part pixel, not yet on a ring: every ring has one.
      if (!inside(x, y) || inside(x, y - 1) || seen[y * (width + 1) + x]) continue;
      const corners = walk(inside, seen, x, y, width + 1);
      if (corners.length < 24) continue;
      found.push({ ring: thin(corners, most, width, height), area: signedArea(corners) });
    }
  }
  found.sort((a, b) => b.area - a.area);
  const [outer, ...rest] = found;
  if (!outer) return [];
  return [outer.ring, ...rest.filter(({ area }) => area < 0).map(({ ring }) => ring)];
}

/** Keeps the part on the right hand, from the top left corner of a top side back to it. */
function walk(
  inside: (x: number, y: number) => boolean,
  seen: Uint8Array,
  startX: number,
  startY: number,
  stride: number,
): Ring {
  const corners: Ring = [];
  let x = startX;
  let y = startY;
  let turn = 0;
  do {
    corners.push([x, y]);
    if (turn === 0) seen[y * stride + x] = 1;
    const [dx, dy] = TURNS[turn] ?? TURNS[0];
    x += dx;
    y += dy;
    const ahead = frontPixels(x, y, turn);
    if (inside(...ahead.left)) turn = (turn + 3) % 4;
    else if (!inside(...ahead.right)) turn = (turn + 1) % 4;
  } while (x !== startX || y !== startY || turn !== 0);
  return corners;
}

/** The two pixels ahead of a corner, to the left and right of the way on. */
function frontPixels(x: number, y: number, turn: number): { left: [number, number]; right: [number, number] } {
  if (turn === 0) return { left: [x, y - 1], right: [x, y] };
  if (turn === 1) return { left: [x, y], right: [x - 1, y] };
  if (turn === 2) return { left: [x - 1, y], right: [x - 1, y - 1] };
  return { left: [x - 1, y - 1], right: [x, y - 1] };
}

function signedArea(corners: Ring): number {
  let twice = 0;
  for (let i = 0; i < corners.length; i++) {
    const [x, y] = corners[i] ?? [0, 0];
    const [nextX, nextY] = corners[(i + 1) % corners.length] ?? [0, 0];
    twice += x * nextY - nextX * y;
  }
  return twice / 2;
}

function thin(corners: Ring, most: number, width: number, height: number): Ring {
  const step = Math.max(1, Math.ceil(corners.length / most));
  return corners.filter((_, i) => i % step === 0).map(([x, y]) => [x / width, y / height]);
}
