import { libraryCauses, libraryCautions, libraryClasses, libraryFixes, librarySources } from "../schema";

/** The columns that make up an entry of each kind: a class page, the editor and an exported file read the same ones. */
export const classColumns = {
  slug: libraryClasses.slug,
  title: libraryClasses.title,
  short: libraryClasses.short,
  atStrike: libraryClasses.atStrike,
  inFinalPlate: libraryClasses.inFinalPlate,
  tells: libraryClasses.tells,
  checks: libraryClasses.checks,
  prevention: libraryClasses.prevention,
  stripNote: libraryClasses.stripNote,
  otherLikelihood: libraryClasses.otherLikelihood,
  sourceKeys: libraryClasses.sourceKeys,
  synonyms: libraryClasses.synonyms,
  position: libraryClasses.position,
};
export const causeColumns = {
  slug: libraryCauses.slug,
  title: libraryCauses.title,
  station: libraryCauses.stationKind,
  why: libraryCauses.why,
  proof: libraryCauses.proof,
  likelihood: libraryCauses.likelihood,
  baseMetals: libraryCauses.baseMetals,
  sourceKeys: libraryCauses.sourceKeys,
  synonyms: libraryCauses.synonyms,
};
export const fixColumns = {
  slug: libraryFixes.slug,
  title: libraryFixes.title,
  steps: libraryFixes.steps,
  whenNot: libraryFixes.whenNot,
  materials: libraryFixes.materials,
  sourceKeys: libraryFixes.sourceKeys,
};
export const cautionColumns = {
  key: libraryCautions.key,
  level: libraryCautions.level,
  text: libraryCautions.text,
  sourceKey: libraryCautions.sourceKey,
};
export const sourceColumns = { key: librarySources.key, kind: librarySources.kind, citation: librarySources.citation };
