/** The few curves that every surface is drawn with. */

/** 0 at or before `from`, 1 at or after `to`, smooth between; `from` may be the larger. */
export function ramp(from: number, to: number, at: number): number {
  const t = (at - from) / (to - from);
  if (t <= 0) return 0;
  if (t >= 1) return 1;
  return t * t * (3 - 2 * t);
}

/** `from` at share 0, `to` at share 1. */
export function mix(from: number, to: number, share: number): number {
  return from + (to - from) * share;
}

/** 1 at zero, falling off like a bell whose half-width is `width`. */
export function bell(distance: number, width: number): number {
  const t = distance / width;
  return t > 3 || t < -3 ? 0 : Math.exp(-t * t);
}
