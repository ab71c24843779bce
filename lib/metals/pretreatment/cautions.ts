/** The cautions of the routes, said the same way at every step that needs them. */
import type { RouteCaution } from "./route";

const stop = (text: string): RouteCaution => ({ level: "stop", text });
const care = (text: string): RouteCaution => ({ level: "caution", text });

export const ACID = care("Acid: gloves, apron, face shield, exhaust on. Acid into water, never water into acid.");
export const HOT_ALKALI = care(
  "Hot alkali burns skin and eyes. Face shield and gloves, exhaust on; hydrogen above it, so no spark.",
);
export const POWER = care(
  "Rack on with the current off, unless the step says live entry. Dry gloves at the rectifier.",
);
export const LIVE_ENTRY = care(
  "Live entry sparks at a poor contact, and the gas above the bath burns. Hook on firmly, low volts, face away.",
);
export const NICKEL = care("Nickel salts and mist sensitise skin and lungs and can cause cancer. Gloves, exhaust.");
export const DUST = care("Work wet, or with extraction and a fitted respirator.");
export const LEAD_DUST = care("Leaded metal gives lead dust. Wet abrasion only; wash hands before food.");
export const HOT_PART = care("Oven parts burn. Bake rinsed and dry parts only, never one with a sealed cavity.");
export const SHEET = care(
  "Read this solution's safety data sheet first. Local codes and licensed practice come before this card.",
);

export const CYANIDE_NEXT = stop(
  "A cyanide bath comes next. Acid on cyanide gives off deadly hydrogen cyanide. Two rinses of their own; no acid goes past here.",
);
export const CYANIDE = stop(
  "Cyanide: trained people only, exhaust on, pH above 10.5 (common practice). Never let acid reach it. It enters through skin too.",
);
export const NITRIC = stop(
  "Nitric acid: trained people only, exhaust on. Leave at the first brown fume; lung harm can come hours later. Never near cyanide.",
);
export const FLUORIDE = stop(
  "Fluoride with acid is hydrofluoric acid: trained people only, full cover, calcium gluconate at hand. A burn may not hurt at first.",
);
export const CHROMIC = stop(
  "Chromic acid is hexavalent chromium, which causes cancer. Trained people only, with exhaust and skin cover.",
);
export const HYDROGEN = stop(
  "High-strength steel (above about 1000 MPa, 31 HRC): no acid, no cathodic cleaning. Hold it for an engineer.",
);
export const BERYLLIUM = stop("Beryllium copper: no dry abrasion, ever. Hold it for somebody trained for beryllium.");
