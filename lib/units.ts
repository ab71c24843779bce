/**
 * The trade writes in two systems: a bath sheet in °F, oz/gal and A/ft², a supplier's in °C, g/L and A/dm².
 * Inside, everything is °C, dm², µm, g, L and A/dm²; these are the only conversions. The inch (25.4 mm), the pound and
 * the US gallon are exact by definition (NIST Handbook 44, appendix C), and so is everything derived from them here.
 */
export const UM_PER_MIL = 25.4;
export const DM2_PER_SQUARE_INCH = 0.064516;
export const DM2_PER_SQUARE_FOOT = 9.290304;
export const G_PER_TROY_OUNCE = 31.1034768;
export const G_PER_OUNCE = 28.349523125;
export const L_PER_US_GALLON = 3.785411784;

/** °F to °C. Example: 130 °F is 54.44 °C. */
export const fahrenheitToC = (tempF: number): number => ((tempF - 32) * 5) / 9;
/** °C to °F. Example: 100 °C is 212 °F. */
export const celsiusToF = (tempC: number): number => (tempC * 9) / 5 + 32;

/** Thousandths of an inch to µm. Example: 1 mil is 25.4 µm. */
export const milToUm = (thicknessMil: number): number => thicknessMil * UM_PER_MIL;
/** µm to thousandths of an inch. */
export const umToMil = (thicknessUm: number): number => thicknessUm / UM_PER_MIL;

/** Square inches to dm². Example: 37.7 in² is 2.432 dm². */
export const squareInchToDm2 = (areaIn2: number): number => areaIn2 * DM2_PER_SQUARE_INCH;
/** dm² to square inches. */
export const dm2ToSquareInch = (areaDm2: number): number => areaDm2 / DM2_PER_SQUARE_INCH;

/** Troy ounces (how precious metal is priced) to g. */
export const troyOunceToG = (massOzt: number): number => massOzt * G_PER_TROY_OUNCE;
/** g to troy ounces. */
export const gToTroyOunce = (massG: number): number => massG / G_PER_TROY_OUNCE;

/** A/ft² to A/dm². Example: 10 A/ft² is 1.076 A/dm². */
export const asfToADm2 = (densityAFt2: number): number => densityAFt2 / DM2_PER_SQUARE_FOOT;
/** A/dm² to A/ft². */
export const aDm2ToAsf = (densityADm2: number): number => densityADm2 * DM2_PER_SQUARE_FOOT;

/** Ounces per US gallon to g/L. Example: 1 oz/gal is 7.489 g/L. */
export const ozPerGallonToGPerL = (ozPerGal: number): number => (ozPerGal * G_PER_OUNCE) / L_PER_US_GALLON;
/** g/L to ounces per US gallon. */
export const gPerLToOzPerGallon = (gPerL: number): number => (gPerL * L_PER_US_GALLON) / G_PER_OUNCE;
