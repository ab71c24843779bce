import { readFileSync } from "node:fs";
import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { classGlyph } from "@/components/cases/class-glyph";
import { Tag } from "@/components/cases/tag";
import { TAG_STATES } from "@/components/cases/tag-state";
import { LineStrip } from "@/components/line/line-strip";
import { placesFor } from "@/components/shell/places";
import { readTheme } from "@/components/shell/theme";
import { GLYPH_NAMES } from "@/components/ui/glyph-names";
import { SHELF_CLASSES } from "@/lib/cases/case-words";
import type { StationView } from "@/lib/line/station-view";

const sprite = readFileSync("components/ui/glyphs.svg", "utf8");
const tailStyles = readFileSync("app/styles/tag-tails.css", "utf8");

describe("glyphs", () => {
  it("the sprite holds exactly the pictures that the code may name", () => {
    const drawn = [...sprite.matchAll(/<symbol id="([\w-]+)"/g)].map((match) => match[1]);
    expect([...drawn].sort()).toEqual([...GLYPH_NAMES].sort());
  });

  it("every class of the shelf has its own picture", () => {
    expect(new Set(SHELF_CLASSES.map((slug) => classGlyph(slug))).size).toBe(SHELF_CLASSES.length);
  });

  it("a class of the shop's own and 'can't tell' have pictures too", () => {
    expect(classGlyph("tumble-scuff")).toBe("own-class");
    expect(classGlyph(null)).toBe("not-enough");
  });
});

describe("the hold tag", () => {
  it.each(TAG_STATES)("says in words what its tail says when it is %s", (state) => {
    const html = renderToStaticMarkup(
      <Tag
        caseRef="CT-2607-0042"
        state={state}
        stateWords="Held 38 min"
        classSlug="dewetting"
        classWords="Dewetting?"
        meta="3 of 48 shells"
      />,
    );
    expect(html).toContain("Held 38 min");
    expect(html).toContain("CT-2607-0042");
    expect(html).toContain("Dewetting?");
    expect(tailStyles).toContain(`.tag--${state} `);
    expect(tailStyles).toContain(`.state--${state}`);
  });

  it("shows no money unless it is handed some", () => {
    const html = renderToStaticMarkup(
      <Tag caseRef="CT-1" state="held" stateWords="Held" classSlug={null} classWords="Can't tell" meta="1 pin" />,
    );
    expect(html).not.toContain("at risk");
  });
});

describe("the line strip", () => {
  const station = (over: Partial<StationView>): StationView => ({
    slug: "activate",
    name: "Activate",
    kind: "activate",
    note: "5 days over",
    level: 0,
    age: 1.2,
    held: 0,
    ...over,
  });
  const strip = (stations: StationView[], pressed: string | null) =>
    renderToStaticMarkup(
      <LineStrip
        mode="full"
        stations={stations}
        pressed={pressed}
        hrefFor={(slug) => (slug ? `/?station=${slug}` : "/")}
      />,
    );

  it("a station leads to the screen narrowed to it, the pressed one back to the whole line", () => {
    expect(strip([station({})], null)).toContain('href="/?station=activate"');
    expect(strip([station({})], "activate")).toContain('href="/"');
    expect(strip([station({})], "activate")).toContain('aria-current="true"');
  });

  it("hangs a tag only where parts are held, and says how many", () => {
    expect(strip([station({ held: 0 })], null)).not.toContain("held part");
    expect(strip([station({ held: 1 })], null)).toContain("1 held part traces back here");
    expect(strip([station({ held: 15 })], null)).toContain("15 held parts trace back here");
  });

  it("says the state of the solution in words, and never draws a tank empty", () => {
    expect(strip([station({ level: 0 })], null)).toContain("5 days over");
    // look.md section 5: the level is never under 12 %.
    expect(strip([station({ level: 0 })], null)).toContain("--lvl:0.12");
  });
});

describe("places", () => {
  // Places by role as drawn in the approved screens.
  it("a plater sees no second look and no money", () => {
    expect(placesFor(["plater"]).map((place) => place.title)).toEqual([
      "Today",
      "Snap",
      "Rework",
      "Casebook",
      "Library",
      "Practice",
      "Part check",
    ]);
  });

  it("a person with two hats sees the places of both, once each", () => {
    expect(placesFor(["owner", "plater"]).map((place) => place.title)).toEqual([
      "Today",
      "Snap",
      "Second look",
      "Rework",
      "Casebook",
      "Library",
      "Practice",
      "Part check",
      "Strip",
      "Ledger",
      "Crew",
    ]);
  });

  it("the desktop bar holds no more than it has room for: the part check stands in the menus", () => {
    expect(placesFor(["owner", "senior", "plater"]).filter((place) => !place.isInBar)).toMatchObject([
      { slug: "metals", title: "Part check", href: "/metals/check" },
    ]);
  });
});

describe("night shift", () => {
  it("follows the system until somebody chooses, and believes no other word", () => {
    expect(readTheme(undefined)).toBeUndefined();
    expect(readTheme("purple")).toBeUndefined();
    expect(readTheme("night")).toBe("night");
    expect(readTheme("day")).toBe("day");
  });
});
