import { HARDNESS } from "@/lib/costs/hardness";
import { Z_90 } from "@/lib/costs/pert";
import type { ReworkInput } from "@/lib/costs/rework-input";
import { USUAL_REWORK_TIMES as T } from "@/lib/costs/rework-times";
import { STRIP_METHODS, type StripMethod } from "@/lib/costs/strip-methods";
import { planStrip, type StripPlan, type StripTable } from "@/lib/costs/strip-plan";
import { strikeOf } from "@/lib/plating/deposit-stack";
import { METALS } from "@/lib/plating/metals";
import { usualPlateMinutes } from "@/lib/plating/plate-practice";

/** A case and the ways that are allowed for it: choosing baths is no arithmetic, so it is done before the clock runs. */
export interface BareCase {
  input: ReworkInput;
  plans: Extract<StripPlan, { allowed: true }>[];
}

export function bareCase(input: ReworkInput, table: StripTable): BareCase {
  const onPart = input.stageFound === "at-strike" ? strikeOf(input.stack) : input.stack;
  const plans = STRIP_METHODS.flatMap((method) => {
    const plan = planStrip(method, input.baseMetal, onPart, table);
    return plan.allowed ? [plan] : [];
  });
  return { input, plans };
}

const exact = new Float64Array(7);

interface BareMinutes {
  low: number;
  likely: number;
  high: number;
  mean: number;
}

/** The figures of an estimate without a word. */
export interface BareFigures {
  method: StripMethod;
  meanCents: number;
  low90Cents: number;
  high90Cents: number;
  lineCents: number[];
  minutes: BareMinutes;
  tankMinutes: BareMinutes;
  metalWrittenOffG: number;
}

/** The estimate written flat: the terms of `rework-terms.ts`, nothing checked, nothing named, nothing remembered. */
export function bareEstimate({ input, plans }: BareCase): BareFigures | undefined {
  const { rates, stageFound, partValueCents = 0, minutesCorrection: correction = 1 } = input;
  const atStrike = stageFound === "at-strike";
  const wasteEach = rates.wasteCentsPerL;
  const abrasive = rates.abrasiveCentsPerMinute;
  let best: BareFigures | undefined;
  for (const plan of plans) {
    const { method } = plan;
    const corrected = typeof correction === "number" ? correction : correction[method];
    const n = input.quantity;
    const dm2 = n * input.areaDm2;
    const loads = dm2 / T.loadDm2;
    const labour = (rates.labourCentsPerHour / 60) * corrected;
    const line = rates.lineCentsPerHour / 60;
    let mean = 0;
    let lineMean = 0;
    let writtenOff = 0;
    let again = 0;
    let chemistry = 0;
    let waste = 0;
    let variance = 0;
    let least = 0;
    let most = 0;
    let grams = 0;
    let minutesLow = 0;
    let minutesLikely = 0;
    let minutesHigh = 0;
    let tankLow = 0;
    let tankLikely = 0;
    let tankHigh = 0;
    let dissolves = false;
    let plateMinutes = 0;

    const setUp = atStrike ? T.setUpAtStrikeMinutes[method] : T.setUpMinutes[method];
    minutesLow += setUp.low * corrected;
    minutesLikely += setUp.likely * corrected;
    minutesHigh += setUp.high * corrected;
    mean += ((setUp.low + 4 * setUp.likely + setUp.high) / 6) * labour;
    let low = setUp.low * labour;
    let high = setUp.high * labour;
    variance += ((high - low) / 6) ** 2;
    least += low;
    most += high;

    const each = atStrike ? T.handlingAtStrikeMinutesPerPart : T.handlingMinutesPerPart;
    minutesLow += each.low * n * corrected;
    minutesLikely += each.likely * n * corrected;
    minutesHigh += each.high * n * corrected;
    mean += ((each.low + 4 * each.likely + each.high) / 6) * n * labour;
    low = each.low * n * labour;
    high = each.high * n * labour;
    variance += ((high - low) / 6) ** 2;
    least += low;
    most += high;

    for (const { kind, layer, row } of plan.steps) {
      const { metal, thicknessUm: um } = layer;
      const g = dm2 * um * 0.01 * METALS[metal].densityGCm3;
      const worth = g * (rates.metalCentsPerG[metal] ?? 0);
      const lost = kind === "polish" ? 1 : 1 - (rates.recoveryShare[metal] ?? 0);
      writtenOff += worth * lost;
      again += worth;
      grams += g * lost;
      plateMinutes += usualPlateMinutes(layer);
      if (kind === "polish") {
        const { hv } = HARDNESS[metal];
        const rate = row.minutesPerDm2Um;
        const per = (dm2 * um) / 100;
        const a = rate.low * hv.low * per;
        const m = rate.likely * hv.likely * per;
        const b = rate.high * hv.high * per;
        minutesLow += a * corrected;
        minutesLikely += m * corrected;
        minutesHigh += b * corrected;
        mean += ((a + 4 * m + b) / 6) * labour;
        chemistry += ((a + 4 * m + b) / 6) * abrasive;
        low = a * (labour + abrasive);
        high = b * (labour + abrasive);
      } else {
        dissolves = true;
        const { rateUmPerMin: rate, holdingGPerL: holds } = row;
        const solution = row.solutionCentsPerL ?? rates.solutionCentsPerL;
        const per = um * loads;
        const a = per / rate.high;
        const m = per / rate.likely;
        const b = per / rate.low;
        tankLow += a;
        tankLikely += m;
        tankHigh += b;
        minutesLow += a * T.attendedShare * corrected;
        minutesLikely += m * T.attendedShare * corrected;
        minutesHigh += b * T.attendedShare * corrected;
        mean += ((a + 4 * m + b) / 6) * T.attendedShare * labour;
        lineMean += ((a + 4 * m + b) / 6) * line;
        const litreLow = g / holds.high;
        const litreHigh = g / holds.low;
        const litres = (litreLow + (4 * g) / holds.likely + litreHigh) / 6;
        chemistry += litres * solution;
        waste += litres * wasteEach;
        low = a * (T.attendedShare * labour + line) + litreLow * (solution + wasteEach);
        high = b * (T.attendedShare * labour + line) + litreHigh * (solution + wasteEach);
      }
      variance += ((high - low) / 6) ** 2;
      least += low;
      most += high;
    }
    if (dissolves) {
      const polish = T.afterStripPolishMinutesPerDm2;
      minutesLow += polish.low * dm2 * corrected;
      minutesLikely += polish.likely * dm2 * corrected;
      minutesHigh += polish.high * dm2 * corrected;
      mean += ((polish.low + 4 * polish.likely + polish.high) / 6) * dm2 * labour;
      chemistry += ((polish.low + 4 * polish.likely + polish.high) / 6) * dm2 * abrasive;
      low = polish.low * dm2 * (labour + abrasive);
      high = polish.high * dm2 * (labour + abrasive);
      variance += ((high - low) / 6) ** 2;
      least += low;
      most += high;
    }

    let lineLow = T.lineToStrikeMinutesPerPart.low;
    let lineLikely = T.lineToStrikeMinutesPerPart.likely;
    let lineHigh = T.lineToStrikeMinutesPerPart.high;
    let lineTankLow = T.lineToStrikeTankMinutes.low;
    let lineTankLikely = T.lineToStrikeTankMinutes.likely;
    let lineTankHigh = T.lineToStrikeTankMinutes.high;
    if (!atStrike) {
      lineLow += T.lineBeyondStrikeMinutesPerPart.low;
      lineLikely += T.lineBeyondStrikeMinutesPerPart.likely;
      lineHigh += T.lineBeyondStrikeMinutesPerPart.high;
      lineTankLow += T.lineBeyondStrikeTankMinutes.low;
      lineTankLikely += T.lineBeyondStrikeTankMinutes.likely;
      lineTankHigh += T.lineBeyondStrikeTankMinutes.high;
    }
    minutesLow += lineLow * n * corrected;
    minutesLikely += lineLikely * n * corrected;
    minutesHigh += lineHigh * n * corrected;
    tankLow += lineTankLow * loads;
    tankLikely += lineTankLikely * loads;
    tankHigh += lineTankHigh * loads;
    mean += ((lineLow + 4 * lineLikely + lineHigh) / 6) * n * labour;
    lineMean += ((lineTankLow + 4 * lineTankLikely + lineTankHigh) / 6) * loads * line;
    low = lineLow * n * labour + lineTankLow * loads * line;
    high = lineHigh * n * labour + lineTankHigh * loads * line;
    variance += ((high - low) / 6) ** 2;
    least += low;
    most += high;

    const factor = T.platingTimeFactor;
    const plate = plateMinutes * loads;
    minutesLow += factor.low * plate * T.attendedShare * corrected;
    minutesLikely += factor.likely * plate * T.attendedShare * corrected;
    minutesHigh += factor.high * plate * T.attendedShare * corrected;
    tankLow += factor.low * plate;
    tankLikely += factor.likely * plate;
    tankHigh += factor.high * plate;
    mean += ((factor.low + 4 * factor.likely + factor.high) / 6) * plate * T.attendedShare * labour;
    lineMean += ((factor.low + 4 * factor.likely + factor.high) / 6) * plate * line;
    low = factor.low * plate * (T.attendedShare * labour + line);
    high = factor.high * plate * (T.attendedShare * labour + line);
    variance += ((high - low) / 6) ** 2;
    least += low + writtenOff + again;
    most += high + writtenOff + again;

    const share = atStrike ? T.scrapShareAtStrike : T.scrapShareAfterPlate[method];
    const risk = ((share.low + 4 * share.likely + share.high) / 6) * n * partValueCents;
    low = share.low * n * partValueCents;
    high = share.high * n * partValueCents;
    variance += ((high - low) / 6) ** 2;
    least += low;
    most += high;

    if (stageFound === "returned") {
      const back = T.returnMinutes;
      minutesLow += back.low * corrected;
      minutesLikely += back.likely * corrected;
      minutesHigh += back.high * corrected;
      mean += ((back.low + 4 * back.likely + back.high) / 6) * labour;
      low = back.low * labour;
      high = back.high * labour;
      variance += ((high - low) / 6) ** 2;
      least += low;
      most += high;
    }

    exact[0] = mean;
    exact[1] = lineMean;
    exact[2] = writtenOff;
    exact[3] = again;
    exact[4] = chemistry;
    exact[5] = waste;
    exact[6] = risk;
    const total = mean + lineMean + writtenOff + again + chemistry + waste + risk;
    const meanCents = Math.round(total);
    if (best !== undefined && meanCents >= best.meanCents) continue;
    let floors = 0;
    const lineCents: number[] = [];
    for (let index = 0; index < 7; index += 1) {
      const floor = Math.floor(exact[index] ?? 0);
      floors += floor;
      lineCents.push(floor);
    }
    let missing = meanCents - floors;
    while (missing > 0) {
      let at = 0;
      let rest = -1;
      for (let index = 0; index < 7; index += 1) {
        const over = (exact[index] ?? 0) - (lineCents[index] ?? 0);
        if (over > rest) {
          at = index;
          rest = over;
        }
      }
      lineCents[at] = (lineCents[at] ?? 0) + 1;
      missing -= 1;
    }
    const half = Z_90 * Math.sqrt(variance);
    best = {
      method,
      meanCents,
      low90Cents: Math.round(Math.max(least, total - half)),
      high90Cents: Math.round(Math.min(most, total + half)),
      lineCents,
      minutes: {
        low: minutesLow,
        likely: minutesLikely,
        high: minutesHigh,
        mean: (minutesLow + 4 * minutesLikely + minutesHigh) / 6,
      },
      tankMinutes: {
        low: tankLow,
        likely: tankLikely,
        high: tankHigh,
        mean: (tankLow + 4 * tankLikely + tankHigh) / 6,
      },
      metalWrittenOffG: grams,
    };
  }
  return best;
}
