import { describe, expect, it } from "vitest";
import { BASE_METALS, SHELF_CLASSES } from "@/lib/cases/case-words";
import { ACTIVATORS, ACTIVATOR_SLUGS } from "@/lib/metals/pretreatment/activator-kinds";
import { activatorSuits } from "@/lib/metals/pretreatment/activators";
import { pretreatmentFor } from "@/lib/metals/pretreatment/pretreatment";
import type { PretreatmentRoute, RouteCaution, RouteStep } from "@/lib/metals/pretreatment/route";
import { SOURCES } from "@/lib/metals/pretreatment/sources";

const routes = BASE_METALS.flatMap((metal) => pretreatmentFor(metal) ?? []);
const requireRoute = (metal: (typeof BASE_METALS)[number]): PretreatmentRoute => {
  const route = pretreatmentFor(metal);
  if (!route) throw new Error(`No route for ${metal}`);
  return route;
};

/** Every column of steps that a plater may follow: the route, and what each variant puts in. */
const columns = routes.flatMap((route) => [
  { name: route.title, steps: route.steps },
  ...route.variants.map((variant) => ({ name: `${route.title}: ${variant.title}`, steps: variant.steps })),
]);
const steps = columns.flatMap((column) =>
  column.steps.map((step) => ({ name: `${column.name}: ${step.title}`, step })),
);

/** Where two steps meet with one of these words on each side and no water between. */
function meetings(column: readonly RouteStep[], one: string, other: string): string[] {
  const wet = column.filter((step) => step.liquid !== "none");
  return wet.flatMap((step, index) => {
    const pair = [step.liquid, wet[index + 1]?.liquid];
    return pair.includes(one as never) && pair.includes(other as never) ? [step.title] : [];
  });
}

/** A line that stops people, about this very danger. */
const stops = (cautions: readonly RouteCaution[], danger: RegExp) =>
  cautions.some((caution) => caution.level === "stop" && danger.test(caution.text));

const DANGERS = [
  { word: /cyanide/i, stop: /cyanide/i },
  { word: /nitric/i, stop: /nitric.*trained people only/i },
  { word: /fluoride|fluobor|hydrofluoric/i, stop: /hydrofluoric acid: trained people only/i },
  { word: /chromic|chromate/i, stop: /hexavalent chromium/i },
];

describe("the routes", () => {
  it("has one for each base metal the shop names, and none for a metal nobody named", () => {
    expect(BASE_METALS.filter((metal) => pretreatmentFor(metal) === null)).toEqual(["other"]);
    expect(routes.map((route) => route.baseMetal)).toEqual(BASE_METALS.filter((metal) => metal !== "other"));
  });

  it("names a known source beside every step, variant, strike, activator and watch-out", () => {
    const facts = routes.flatMap((route) => [
      ...route.steps,
      ...route.variants,
      ...route.variants.flatMap((variant) => variant.steps),
      ...route.strike.suits,
      ...route.strike.unsuitable,
      ...route.activators.suits,
      ...route.activators.unsuitable,
      ...route.watchOuts,
    ]);
    expect(facts.length).toBeGreaterThan(300);
    const names = SOURCES.map((source) => source.name);
    const bare = facts.filter(
      ({ source }) => !source.split("; ").every((part) => names.some((name) => part.includes(name))),
    );
    expect(bare.map((fact) => fact.source)).toEqual([]);
  });

  it("lists at its foot every source that it names", () => {
    for (const route of routes) {
      const named = SOURCES.filter(({ name }) => route.steps.some((step) => step.source.includes(name)));
      expect(route.notes).toEqual(expect.arrayContaining(named));
    }
  });

  it("says a step in few words", () => {
    expect(steps.filter(({ step }) => step.detail.length > 165).map(({ name }) => name)).toEqual([]);
  });

  it("ends every route in a look at the strike before anything covers it", () => {
    for (const route of routes) {
      const kinds = route.steps.map((step) => step.station);
      expect(kinds.at(-1)).toBe("inspect");
      expect(kinds).toContain("strike");
      expect(route.steps.some((step) => step.title.includes("water break"))).toBe(true);
    }
  });

  it("leads only to classes of the shelf", () => {
    const slugs = routes.flatMap((route) => [...route.goesWrong, ...route.watchOuts].map((each) => each.classSlug));
    expect(slugs.filter((slug) => !SHELF_CLASSES.includes(slug) || slug === "sound")).toEqual([]);
    for (const route of routes) expect(route.goesWrong.length).toBeGreaterThanOrEqual(3);
  });
});

describe("the cautions", () => {
  it("puts a stop beside every step that speaks of cyanide, nitric, fluoride or chromium", () => {
    const missing = steps.flatMap(({ name, step }) => {
      const words = `${step.title} ${step.detail} ${step.proof ?? ""}`;
      return DANGERS.filter((danger) => danger.word.test(words) && !stops(step.cautions, danger.stop)).map(
        (danger) => `${name}: ${danger.word.source}`,
      );
    });
    expect(missing).toEqual([]);
    expect(steps.filter(({ step }) => step.liquid === "cyanide" && !stops(step.cautions, /never let acid/i))).toEqual(
      [],
    );
  });

  it("puts it beside every variant that says so, on itself or on its steps", () => {
    const missing = routes.flatMap((route) =>
      route.variants.flatMap((variant) => {
        const all = [...variant.cautions, ...variant.steps.flatMap((step) => step.cautions)];
        return DANGERS.filter((danger) => danger.word.test(variant.words) && !stops(all, danger.stop)).map(
          () => variant.title,
        );
      }),
    );
    expect(missing).toEqual([]);
  });

  it("asks for trained people wherever an activator holds cyanide, nitric or fluoride", () => {
    const dangerous = ACTIVATORS.filter(({ words }) => /cyanide|nitric|fluor/i.test(words));
    expect(dangerous.map((kind) => kind.slug)).toEqual([
      "acid-salt-fluoride",
      "fluoboric",
      "cyanide-dip",
      "nitric-desmut",
      "fluoride-desmut",
    ]);
    expect(dangerous.filter(({ words }) => !words.includes("trained people only"))).toEqual([]);
  });

  it("never lets acid and cyanide follow each other without a rinse", () => {
    expect(columns.flatMap((column) => meetings(column.steps, "acid", "cyanide"))).toEqual([]);
  });

  it("would notice if they did", () => {
    const [acid, , strike] = ["acid", "water", "cyanide"].map(
      (liquid) => ({ ...steps[0]?.step, title: liquid, liquid }) as RouteStep,
    );
    expect(acid && strike && meetings([acid, strike], "acid", "cyanide")).toEqual(["acid"]);
    expect(acid && strike && meetings([strike, acid], "acid", "cyanide")).toEqual(["cyanide"]);
  });

  it("says stop at the rinse between an acid and a cyanide bath", () => {
    for (const { name, steps: column } of columns) {
      column.forEach((step, index) => {
        if (step.liquid !== "cyanide") return;
        expect(stops(column[index - 1]?.cautions ?? [], /acid on cyanide/i), name).toBe(true);
      });
    }
  });
});

describe("the metals", () => {
  it("zincates aluminium twice, strips between in nitric, and brings no acid after the second coat", () => {
    const { steps: route } = requireRoute("aluminium");
    const at = route.flatMap((step, index) => (step.title.startsWith("Zincate") ? [index] : []));
    const [first = -1, second = -1] = at;
    expect(at).toHaveLength(2);
    expect(route.slice(first, second).some((step) => /nitric/i.test(step.title))).toBe(true);
    expect(route.slice(second).filter((step) => step.liquid === "acid")).toEqual([]);
    expect(activatorSuits("zincate", "aluminium").verdict).toBe("suits");
  });

  it("brings zinc die cast no strong acid, and no acid copper before alkaline copper has sealed it", () => {
    const { steps: route, strike } = requireRoute("zinc");
    const acids = route.filter((step) => step.liquid === "acid");
    // 0.25 to 1 % by volume: common practice for zinc die castings (ASTM B252's field), as the activator list has it.
    expect(acids.map((step) => step.detail)).toEqual([expect.stringContaining("0.25 to 1 % by volume")]);
    expect(route.find((step) => step.station === "strike")?.liquid).toBe("cyanide");
    expect(strike.unsuitable.map((each) => each.name)).toContain("Acid copper");
    for (const kind of ["dilute-sulfuric", "dilute-hydrochloric", "fluoboric", "nitric-desmut"] as const) {
      expect(activatorSuits(kind, "zinc").verdict).toBe("unsuitable");
    }
  });

  it("strikes no metal that copper displaces in acid copper", () => {
    // Standard potentials below copper's +0.34 V: Fe −0.45, Zn −0.76, Al −1.66, Sn −0.14 (CRC Handbook).
    for (const metal of ["steel", "iron", "zinc", "aluminium", "pewter", "brass", "nickel-silver"] as const) {
      expect(
        requireRoute(metal).strike.unsuitable.map((each) => each.name),
        metal,
      ).toContain("Acid copper");
    }
  });

  it("seals stainless and nickel under a chloride nickel strike before any copper", () => {
    for (const metal of ["stainless", "nickel"] as const) {
      const strikes = requireRoute(metal).steps.filter((step) => step.station === "strike");
      expect(strikes.map((step) => step.title)).toEqual([
        "Chloride nickel strike (Woods kind)",
        "Copper cyanide strike",
      ]);
    }
  });

  it("never cleans nickel, silver or gold with the part as anode in the electrocleaner", () => {
    for (const metal of ["nickel", "silver", "gold"] as const) {
      const clean = requireRoute(metal).steps.filter((step) => step.title.startsWith("Electroclean"));
      expect(clean.map((step) => step.title)).toEqual(["Electroclean, cathodic only"]);
    }
  });

  it("takes lead smut off leaded brass with fluoboric acid of 10 to 30 %, at most 2 minutes", () => {
    // Trade column on leaded brass, Products Finishing 2003: 10-30 % fluoboric acid, no more than two minutes.
    const [dip] = requireRoute("brass").variants.flatMap((variant) => variant.steps);
    expect(dip?.detail).toContain("Fluoboric acid 10 to 30 % by volume");
    expect(dip?.minutesWords).toBe("at most 2 min");
  });

  it("holds high-strength steel for an engineer, keeps acid off it, and bakes it by ASTM B850", () => {
    const strong = requireRoute("steel").variants.find((variant) => variant.title.startsWith("High-strength"));
    expect(stops(strong?.cautions ?? [], /engineer/)).toBe(true);
    expect(strong?.steps.filter((step) => step.liquid === "acid")).toEqual([]);
    const bake = strong?.steps.find((step) => step.title.startsWith("Bake"));
    // ASTM B850-98 (2009/2015) Table 1: 190 to 220 °C, 8 h at 1001-1100 MPa, 22 h at 1701-1800 MPa; start within 4 h.
    for (const figure of ["190 to 220 °C", "8 h (1001 to 1100 MPa)", "22 h (1701 to 1800 MPa)", "Within 4 h"]) {
      expect(bake?.detail).toContain(figure);
    }
    // ASTM B849 scope: stress relief at 190 to 230 °C.
    expect(strong?.steps.find((step) => step.source.includes("B849"))?.detail).toContain("190 to 230 °C");
  });
});

describe("activators", () => {
  it("answers for every kind and every metal with a reason, and says so where nobody has ruled", () => {
    for (const slug of ACTIVATOR_SLUGS) {
      for (const metal of BASE_METALS) {
        const answer = activatorSuits(slug, metal);
        expect(answer.why.length).toBeGreaterThan(8);
        expect(answer.source).not.toBe("");
      }
      expect(activatorSuits(slug, "other").verdict).toBe("unknown");
    }
  });

  it("lists each kind once", () => {
    expect(ACTIVATORS.map((kind) => kind.slug)).toEqual([...ACTIVATOR_SLUGS]);
  });

  it("says in each route what the table says", () => {
    for (const route of routes) {
      for (const kind of ACTIVATORS) {
        const { verdict } = activatorSuits(kind.slug, route.baseMetal);
        const listed = {
          suits: route.activators.suits.some((each) => each.name === kind.name),
          unsuitable: route.activators.unsuitable.some((each) => each.name === kind.name),
        };
        expect(listed).toEqual({ suits: verdict === "suits", unsuitable: verdict === "unsuitable" });
      }
      expect(route.activators.suits.length).toBeGreaterThan(0);
      expect(route.activators.unsuitable.length).toBeGreaterThan(0);
    }
  });
});
