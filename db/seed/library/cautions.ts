/** Cautions by key. A step names those it needs; the screen shows them beside the step. 'stop' means: not without the named condition. */
import type { LibraryCaution } from "@/lib/library/library-entry";

const stop = (key: string, sourceKey: string, text: string): LibraryCaution => ({
  key,
  level: "stop",
  text,
  sourceKey,
});
const care = (key: string, sourceKey: string, text: string): LibraryCaution => ({
  key,
  level: "caution",
  text,
  sourceKey,
});

export const cautions: LibraryCaution[] = [
  stop(
    "acid-cyanide",
    "osha-1000",
    "Acid never meets cyanide: not in the tank, on the rack, in a rinse, a drain or a bucket. Together they give off hydrogen cyanide (limit 10 ppm, IDLH 50 ppm). Rinse twice between them, with separate rinses for each.",
  ),
  stop(
    "cyanide",
    "osha-1000",
    "If this bath is a cyanide one: trained people only, with ventilation and the shop's cyanide rules. Keep it strongly alkaline (pH 10.5 or more, common practice). It also enters through the skin.",
  ),
  stop(
    "embrittlement",
    "astm-b850",
    "High-strength steel (1000 MPa, about 31 HRC, and up; springs and hard fasteners): acid, cathodic cleaning and plating all put hydrogen in. Stop and hold it for an engineer before another dip. The bake is theirs to set: ASTM B850 gives 190 to 220 °C for 8 to 22 hours by strength, begun within 4 hours of plating (the 4 hours from memory).",
  ),
  stop(
    "hydrofluoric",
    "osha-1000",
    "Fluoride with acid is hydrofluoric acid. Trained people only, with ventilation, full cover and calcium gluconate at hand. A burn may not hurt at first: get medical help for any splash. Limit 3 ppm.",
  ),
  stop(
    "nitric",
    "osha-1000",
    "Nitric acid on metal gives off nitrogen oxides, and lung harm can come hours later. Trained people only, with exhaust ventilation. Leave at the first brown fume and get medical help after breathing it. Keep it away from organics and cyanide.",
  ),
  stop(
    "hexavalent-chromium",
    "osha-1026",
    "Hexavalent chromium causes cancer. Trained people only, with ventilation and skin cover; the limit in air is 5 µg/m³. Stripping chromium anodically in alkali makes it too.",
  ),
  stop(
    "beryllium",
    "osha-1024",
    "Beryllium copper (C17200 and kin): no dry abrasion, ever. The dust causes lung disease. Hold it for somebody trained for beryllium.",
  ),
  stop(
    "persulfate",
    "common-practice",
    "Persulfate is a strong oxidiser and its bath heats up as it works. Make it fresh, leave it uncovered, never bottle the spent bath, keep organics, acid and cyanide away. With ammonia it needs ventilation.",
  ),
  stop(
    "peroxide-dip",
    "common-practice",
    "Peroxide in acid or cyanide heats and foams, and can boil over. Small and fresh, cooled, never in a closed vessel, no organics, trained people only. Peroxide for acid never shares a bottle or tray with peroxide for cyanide.",
  ),
  stop(
    "hydrosulfite",
    "common-practice",
    "Sodium hydrosulfite catches fire when damp and gives off sulfur dioxide with acid. Dry scoop, into plenty of alkaline bath, never acid on it; ventilation on; the drum closed at once.",
  ),
  care(
    "acid-splash",
    "common-practice",
    "Acid: gloves, apron, goggles and face shield, exhaust running. Add acid to water, never water to acid. Eyewash within reach.",
  ),
  care(
    "hot-alkali",
    "common-practice",
    "Hot alkaline cleaner burns skin and eyes, and its mist burns the throat. Face shield and gloves; exhaust on. It dissolves aluminium and zinc with hydrogen gas: no flame or spark.",
  ),
  care(
    "power",
    "common-practice",
    "Rack or lead on with the current off, unless the step says live entry. Dry gloves for rectifier and meter. Bus bar and rectifier repair is for a licensed electrician.",
  ),
  care(
    "live-entry",
    "common-practice",
    "Live entry sparks where the contact is poor, and the gas above the bath burns. Hook on the bar firmly, stay at low voltage, keep your face away from the surface.",
  ),
  care(
    "polishing-dust",
    "osha-1000",
    "Work wet, or with extraction and a fitted respirator: copper dust limit 1 mg/m³, nickel 1 mg/m³ (NIOSH asks 0.015). Rinse cyanide off the part before you touch it with an abrasive. Beryllium copper: wet only, and only by somebody trained for it.",
  ),
  care(
    "lead-dust",
    "osha-1025",
    "Leaded brass, leaded bronze and old pewter give lead dust. Wet abrasion only; wash hands before food.",
  ),
  care(
    "silver-dust",
    "osha-1000",
    "Silver dust and mist stain skin and eyes for good: limit 0.01 mg/m³. Wet, with extraction, no dry wheel.",
  ),
  care(
    "nickel",
    "osha-1000",
    "Nickel salts and mist sensitise skin and lungs and can cause cancer. Gloves, exhaust, no bare-hand racks. Limit 1 mg/m³; NIOSH asks 0.015.",
  ),
  care(
    "solvent",
    "common-practice",
    "Solvent: ventilate, no flame or hot part near by, the right gloves. Keep the rags in a closed metal bin.",
  ),
  care(
    "compressed-air",
    "common-practice",
    "Air gun: goggles, low pressure, never towards skin. It throws acid and cyanide out of holes and seams.",
  ),
  care(
    "hot-part",
    "common-practice",
    "The part is hot enough to burn and wet solution flashes to steam. Heat only a rinsed and dried part, never one with sealed cavities.",
  ),
  care(
    "brush-power",
    "common-practice",
    "Brush plating: solution and current in the same hand. Dry handle, sound insulation, gloves, no ring or watch. Catch the run-off; acid and cyanide trays stay apart.",
  ),
  care(
    "sheet",
    "common-practice",
    "Read the safety data sheet of the very solution in the tank before you start; trade names hide fluoride, cyanide and peroxide.",
  ),
  care(
    "waste",
    "epa-261",
    "Spent bath, strip and rinse go to treatment, each to its own line, never to the floor drain. Cyanide bath and cyanide strip are F007 and F009, treatment sludge F006. Follow the permit; a licensed operator treats it.",
  ),
];
