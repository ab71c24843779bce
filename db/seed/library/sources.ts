/** What the shelf rests on. A figure that nobody could read in its source says 'from memory' where it stands. */
import type { LibrarySource } from "@/lib/library/library-entry";

const published = (key: string, citation: string): LibrarySource => ({ key, kind: "published", citation });

export const sources: LibrarySource[] = [
  {
    key: "common-practice",
    kind: "common-practice",
    citation: "Common practice in plating shops; no single document.",
  },
  {
    key: "from-memory",
    kind: "from-memory",
    citation: "From memory: nobody has checked this figure in print. Shares of causes and minutes are of this kind.",
  },
  published(
    "guidebook-copper",
    "Surface Finishing Guidebook, 2011-12 and 2012-13 editions, copper plating: Tables I, II, III and VI.",
  ),
  published(
    "guidebook-aluminium",
    "Surface Finishing Guidebook, 2011-12 edition, preparation of aluminium for plating.",
  ),
  published("guidebook-brush", "Surface Finishing Guidebook, 2011-12 edition, brush plating."),
  published(
    "astm-b322",
    "ASTM B322, guide for cleaning metals before electroplating (scope read; clauses from memory).",
  ),
  published("astm-b183", "ASTM B183, preparation of low-carbon steel for electroplating (from memory)."),
  published("astm-b242", "ASTM B242, preparation of high-carbon steel for electroplating (from memory)."),
  published("astm-b252", "ASTM B252, preparation of zinc alloy die castings for electroplating (scope read)."),
  published("astm-b253", "ASTM B253-11, preparation of aluminium alloys for electroplating (scope read)."),
  published(
    "astm-b254",
    "ASTM B254, preparation of and electroplating on stainless steel (scope, clauses 4 and 7 read).",
  ),
  published("astm-b281", "ASTM B281, preparation of copper and copper-base alloys for electroplating (scope read)."),
  published("astm-b571", "ASTM B571, qualitative adhesion testing of metallic coatings (public summary read)."),
  published(
    "astm-b849",
    "ASTM B849, stress relief of iron and steel before coating; ISO 9587 is its equal (scope read).",
  ),
  published(
    "astm-b850",
    "ASTM B850, bake of coated steel against hydrogen embrittlement; ISO 9588 is its equal. Table from a public bake chart; the 4 hours to the start from memory.",
  ),
  published("astm-f22", "ASTM F22, water-break test for hydrophobic surface films (from memory)."),
  published("astm-f21", "ASTM F21, atomizer test for hydrophobic surface films (from memory)."),
  published(
    "astm-d3359",
    "ASTM D3359, rating adhesion by tape. Written for paint films: on a strike its use is shop practice.",
  ),
  published("iso-2819", "ISO 2819, review of adhesion tests for electrodeposited coatings (temperatures from memory)."),
  published("iso-9000", "ISO 9000:2015, quality vocabulary: rework, scrap, concession, regrade."),
  published(
    "crc-potentials",
    "CRC Handbook of Chemistry and Physics, standard electrode potentials and acid constants (values from memory).",
  ),
  published(
    "leygraf-2019",
    "Leygraf and others, Corrosion Science 157 (2019) 337: copper looks fully brown-black under 0.8 ± 0.2 µm of cuprite (abstract read).",
  ),
  published(
    "woods-columns",
    "Trade columns and a forum answer on the Woods nickel strike. They agree on the recipe and not on the current density.",
  ),
  published(
    "strip-columns",
    "Trade columns on stripping nickel and chromium (solutions and volts read; rates from memory).",
  ),
  published(
    "strip-coupons",
    "Reuse procedure of a maker of stress coupons: strips for gold, silver and copper (solutions read; rates from memory).",
  ),
  published("osha-1000", "29 CFR 1910.1000, Tables Z-1 and Z-2, air limits; NIOSH pocket values beside them."),
  published("osha-1026", "29 CFR 1910.1026, chromium(VI): 5 µg/m³ over 8 hours, action level 2.5 µg/m³."),
  published("osha-1024", "29 CFR 1910.1024, beryllium (from memory)."),
  published("osha-1025", "29 CFR 1910.1025, lead (from memory)."),
  published("epa-261", "40 CFR 261.22 and 261.31: corrosive waste D002; plating wastes F006 to F009."),
  published("epa-433", "40 CFR 433, metal finishing waste water limits."),
];
