/** What the routes rest on. A fact names one or more of these by its short name; the foot of the page gives the citation. */
import type { RouteSource } from "./route";

export const COMMON = "common practice";
export const MEMORY = "from memory";

const GUIDEBOOK = "Surface Finishing Guidebook";

export const SOURCES: readonly RouteSource[] = [
  {
    name: "Guidebook, surface preparation",
    citation: `${GUIDEBOOK}, 2011-12 to 2013 editions, chemical surface preparation.`,
  },
  {
    name: "Guidebook, aluminium",
    citation: `${GUIDEBOOK}, 2011-12 to 2013 editions, preparation of aluminium for plating.`,
  },
  {
    name: "Guidebook, copper",
    citation: `${GUIDEBOOK}, 2011-12 and 2012-13 editions, copper plating: Tables I, II and VI.`,
  },
  { name: "ASTM B183", citation: "ASTM B183, preparation of low-carbon steel for electroplating (from memory)." },
  { name: "ASTM B242", citation: "ASTM B242, preparation of high-carbon steel for electroplating (from memory)." },
  { name: "ASTM B252", citation: "ASTM B252, preparation of zinc alloy die castings for electroplating (scope read)." },
  { name: "ASTM B253", citation: "ASTM B253-11, preparation of aluminium alloys for electroplating (scope read)." },
  {
    name: "ASTM B254",
    citation: "ASTM B254, preparation of and electroplating on stainless steel (scope, clauses 4 and 7 read).",
  },
  {
    name: "ASTM B281",
    citation: "ASTM B281, preparation of copper and copper-base alloys for electroplating (scope read).",
  },
  { name: "ASTM B320", citation: "ASTM B320, preparation of iron castings for electroplating (from memory)." },
  {
    name: "ASTM B322",
    citation: "ASTM B322, guide for cleaning metals before electroplating (scope read; clauses from memory).",
  },
  { name: "ASTM B343", citation: "ASTM B343, preparation of nickel for electroplating with nickel (scope read)." },
  {
    name: "ASTM B849",
    citation: "ASTM B849, stress relief of iron and steel before coating; ISO 9587 is its equal (scope read).",
  },
  {
    name: "ASTM B850",
    citation:
      "ASTM B850, bake of coated steel against hydrogen embrittlement; ISO 9588 is its equal. Table from a public bake chart; the 4 hours to the start from memory.",
  },
  {
    name: "ASTM D3359",
    citation: "ASTM D3359, rating adhesion by tape. Written for paint films: on a strike its use is shop practice.",
  },
  { name: "ASTM F22", citation: "ASTM F22, water-break test for hydrophobic surface films (from memory)." },
  {
    name: "ISO 2819",
    citation: "ISO 2819, review of adhesion tests for electrodeposited coatings (temperatures from memory).",
  },
  {
    name: "CRC potentials",
    citation: "CRC Handbook of Chemistry and Physics, standard electrode potentials (values from memory).",
  },
  {
    name: "trade columns, Woods",
    citation: "Trade columns on the Woods nickel strike. They agree on the recipe and not on the current density.",
  },
  { name: "trade column, leaded brass", citation: "Trade column on plating leaded brass (Products Finishing, 2003)." },
  { name: "29 CFR 1910.1000", citation: "29 CFR 1910.1000, Tables Z-1 and Z-2, air limits; NIOSH values beside them." },
  { name: COMMON, citation: "Common practice in plating shops; no single document." },
  { name: MEMORY, citation: "From memory: nobody has checked this in print." },
];

/** The sources that these facts name, in the order of the list. */
export function sourcesNamed(facts: readonly string[]): RouteSource[] {
  return SOURCES.filter((source) => facts.some((fact) => fact.includes(source.name)));
}
