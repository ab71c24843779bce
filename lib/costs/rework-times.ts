import { threePoint, type ThreePoint } from "@/lib/costs/pert";
import type { StripMethod } from "@/lib/costs/strip-methods";

/** What rework takes besides the stripping itself. A shop that has clocked its own gives its own. */
export interface ReworkTimes {
  /** Once a batch, whatever its size: mask, make the bath ready, fetch wheels. */
  setUpMinutes: Record<StripMethod, ThreePoint>;
  /** The same at the strike: the part is still on its rack, at the line. */
  setUpAtStrikeMinutes: Record<StripMethod, ThreePoint>;
  /** Each part: rack, unrack, rinse, gauge. */
  handlingMinutesPerPart: ThreePoint;
  handlingAtStrikeMinutesPerPart: ThreePoint;
  /** Each part, hands-on, through the whole line again up to the strike. */
  lineToStrikeMinutesPerPart: ThreePoint;
  /** And on through the final plate and finish. */
  lineBeyondStrikeMinutesPerPart: ThreePoint;
  /** A light polish after a bath took the deposit off, hands-on, per dm². */
  afterStripPolishMinutesPerDm2: ThreePoint;
  /** Tank minutes of one load up to the strike, and beyond it without the plating time itself. */
  lineToStrikeTankMinutes: ThreePoint;
  lineBeyondStrikeTankMinutes: ThreePoint;
  /** Plating time against Faraday's law with usual current and efficiency: a real rack takes a bit less or more. */
  platingTimeFactor: ThreePoint;
  /** Area that one load takes; a smaller batch occupies its share of the tank. */
  loadDm2: number;
  /** Share of the tank minutes in which somebody stands by. */
  attendedShare: number;
  /** Once a batch, when the customer sent it back: receive, write up, ship again. */
  returnMinutes: ThreePoint;
  /** Chance that a part does not survive, 0 to 1. */
  scrapShareAtStrike: ThreePoint;
  scrapShareAfterPlate: Record<StripMethod, ThreePoint>;
  source: string;
}

/** Times of a small job shop. All from memory: nothing published was found that splits rework up like this. */
export const USUAL_REWORK_TIMES: ReworkTimes = {
  setUpMinutes: {
    "polish-back": threePoint(5, 10, 20),
    chemical: threePoint(10, 20, 40),
    electrolytic: threePoint(15, 30, 60),
  },
  setUpAtStrikeMinutes: {
    "polish-back": threePoint(2, 5, 10),
    chemical: threePoint(5, 15, 30),
    electrolytic: threePoint(10, 20, 45),
  },
  handlingMinutesPerPart: threePoint(1, 3, 6),
  handlingAtStrikeMinutesPerPart: threePoint(0.2, 0.5, 1),
  lineToStrikeMinutesPerPart: threePoint(1, 2, 4),
  lineBeyondStrikeMinutesPerPart: threePoint(1, 3, 8),
  afterStripPolishMinutesPerDm2: threePoint(0.3, 0.5, 1),
  lineToStrikeTankMinutes: threePoint(8, 12, 18),
  lineBeyondStrikeTankMinutes: threePoint(5, 8, 15),
  platingTimeFactor: threePoint(0.8, 1, 1.5),
  loadDm2: 10,
  attendedShare: 0.25,
  returnMinutes: threePoint(30, 60, 120),
  scrapShareAtStrike: threePoint(0, 0.002, 0.01),
  scrapShareAfterPlate: {
    "polish-back": threePoint(0.02, 0.08, 0.2),
    chemical: threePoint(0.02, 0.05, 0.15),
    electrolytic: threePoint(0.02, 0.06, 0.18),
  },
  source: "set-up, handling, line and scrap figures: common practice, from memory",
};
