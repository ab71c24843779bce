import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/** Relative luminance and contrast ratio as WCAG 2.2 defines them (w3.org/TR/WCAG22/#dfn-contrast-ratio). */
function luminance(hex: string): number {
  const channel = (from: number) => {
    const share = parseInt(hex.slice(from, from + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

function contrast(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}

function readTokens(theme: "day" | "night"): Map<string, string> {
  const css = readFileSync("app/styles/tokens.css", "utf8");
  const pattern = /--([\w-]+): (?:light-dark\((#\w{6}), (#\w{6})\)|(#\w{6}));/g;
  return new Map(
    [...css.matchAll(pattern)].map(([, name = "", day, night, both]) => [
      name,
      both ?? (theme === "day" ? day : night) ?? "",
    ]),
  );
}

/** Text colour → the papers it is set on. */
const TEXT: Record<string, string> = {
  ink: "ground sheet well tag copper-tint blue-tint green-tint rust-tint amber-tint",
  "ink-2": "ground sheet well tag blue-tint rust-tint amber-tint green-tint",
  "ink-3": "ground sheet tag well blue-tint",
  "on-copper": "copper copper-press",
  "copper-text": "ground sheet tag copper-tint",
  blue: "ground sheet tag blue-tint",
  green: "ground sheet tag green-tint",
  rust: "ground sheet tag rust-tint",
  amber: "ground sheet tag amber-tint",
  sheet: "blue",
  ground: "ink",
  "on-band": "band band-2",
  "on-band-2": "band band-2",
  "copper-band": "band",
  "blue-band": "band",
  "amber-band": "band band-2",
  "rust-band": "band",
  "manila-ink": "manila",
};
/** Edges and marks that carry meaning → what they lie on. */
const SHAPES: Record<string, string> = {
  edge: "ground sheet tag",
  "copper-edge": "ground sheet",
  blue: "ground sheet tag",
  "band-edge": "band",
  rust: "tag",
  amber: "tag",
  green: "tag",
};

function pairs(table: Record<string, string>): [string, string][] {
  return Object.entries(table).flatMap(([front, backs]) =>
    backs.split(" ").map((back): [string, string] => [front, back]),
  );
}

// Floors: WCAG 2.2, 1.4.3 (text 4.5) and 1.4.11 (edges 3).
describe.each(["day", "night"] as const)("in the %s theme", (theme) => {
  const tokens = readTokens(theme);
  const ratio = (front: string, back: string) => contrast(tokens.get(front) ?? "", tokens.get(back) ?? "");

  it.each(pairs(TEXT))("%s is readable on %s", (front, back) => {
    expect(ratio(front, back)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(pairs(SHAPES))("%s can be seen on %s", (front, back) => {
    expect(ratio(front, back)).toBeGreaterThanOrEqual(3);
  });
});

it("black on white is 21 to 1", () => {
  expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 5);
});
