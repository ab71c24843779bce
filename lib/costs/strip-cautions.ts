/**
 * The cautions that go with taking a deposit off, in the words that stand beside the step. `stop` ones are those that
 * can kill or spoil a part for good; a screen marks them with the stop sign.
 */
export const CAUTIONS = {
  acidAndCyanide: { stop: true, words: "Never let acid meet cyanide: it sets prussic acid gas free." },
  trainedOnly: { stop: true, words: "Only for trained people, with extraction on and the safety data sheet read." },
  hexavalent: { stop: true, words: "Hexavalent chromium in the bath and its mist: extraction, gloves, goggles." },
  highStrengthSteel: {
    stop: true,
    words: "High-strength steel and acid: hydrogen makes it brittle. Bake it, and hold it for an engineer.",
  },
  cyanideOxidant: { stop: true, words: "Cyanide with an oxidant foams and heats up: small amounts, extraction on." },
  nitrogenOxides: {
    stop: true,
    words: "Nitric acid gives off brown nitrogen oxides: extraction on, stay out of the fume.",
  },
  cadmium: { stop: true, words: "Cadmium poisons: extraction on, gloves, and its waste kept apart." },
  acidMist: { stop: false, words: "Acid mist: extraction on, goggles and gloves." },
  nickel: { stop: false, words: "Nickel in the bath and its mist: gloves and extraction." },
  hotCaustic: { stop: false, words: "Hot caustic burns skin and eyes: face shield." },
  dilutionHeat: { stop: false, words: "Acid heats up on mixing: acid into water, never water into acid." },
  keepDry: { stop: false, words: "Dry part in, no water in the bath: with water it goes for the steel." },
  dryOrItEtches: { stop: false, words: "Dry part in, no water in the bath: with water it etches the part." },
  smuts: { stop: false, words: "Leaves a smut: wipe it off and rinse before the part goes on." },
  pitting: { stop: false, words: "Can pit steel: take it out as soon as the deposit is off." },
  stopAtCopper: { stop: false, words: "Stop at the copper." },
  watchTime: { stop: false, words: "Etches the part when left in: stand by." },
  heatsUp: { stop: false, words: "Heats up as it works: use it fresh, do not close the container." },
  thiourea: { stop: false, words: "Thiourea is suspected to cause cancer: gloves, extraction." },
  recover: { stop: false, words: "Keep the solution and the swarf: the metal is worth recovering." },
  nickelDust: { stop: false, words: "Nickel dust makes people ill and allergic: polish wet, extract, mask." },
  dust: { stop: false, words: "Polish wet, extract the dust, wear a mask." },
  cleanFirst: { stop: false, words: "Rinse first: no cyanide left on the part." },
  edges: { stop: false, words: "Edges and threads round off: gauge each part." },
  flakes: { stop: false, words: "It comes off as flakes: catch them, they are sharp and worth money." },
  sheetAndPermits: {
    stop: false,
    words: "Read the solution's safety data sheet. Local codes and permits for air and waste water come first.",
  },
} as const satisfies Record<string, { stop: boolean; words: string }>;
export type CautionKey = keyof typeof CAUTIONS;
// Object.keys forgets the keys' type; the object is `as const` and not extended anywhere.
export const CAUTION_KEYS = Object.keys(CAUTIONS) as [CautionKey, ...CautionKey[]];

const STOP_WORDS: ReadonlySet<string> = new Set(
  Object.values(CAUTIONS).flatMap((caution) => (caution.stop ? [caution.words] : [])),
);

/** Whether these words are a strong caution, for the stop sign. */
export function isStopCaution(words: string): boolean {
  return STOP_WORDS.has(words);
}
