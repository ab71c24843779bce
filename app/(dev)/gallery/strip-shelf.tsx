"use client";

import { CrossSection } from "@/components/costs/cross-section";
import { OfferedStripWay } from "@/components/costs/estimate-way";
import { StripBeside } from "@/components/costs/estimate-beside";
import { RefusedStripWay } from "@/components/costs/estimate-refused-way";
import { StripSpread } from "@/components/costs/estimate-spread";
import { ShapeDrawing } from "@/components/costs/shape-drawing";
import { StripSheet } from "@/components/costs/strip-sheet";
import { Section } from "@/components/ui/section";
import { BASE_METALS } from "@/lib/cases/case-words";
import { NO_CORRECTIONS } from "@/lib/costs/estimate-record";
import { AREA_FORMULAS, AREA_SHAPE_TITLES, AREA_SHAPES } from "@/lib/costs/part-area";
import { reckonStrip, scaleEndCents } from "@/lib/costs/reckon-strip";
import { sectionScale } from "@/lib/costs/section-scale";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { SHIPPED_STRIP_TABLE } from "@/lib/costs/strip-plan";
import type { Layer } from "@/lib/plating/deposit-stack";
import { DEPOSIT_METALS } from "@/lib/plating/metals";

const RECKONING = reckonStrip(
  {
    quantity: 12,
    areaDm2: 0.62,
    partValueCents: 61_000,
    baseMetal: "brass",
    alloy: "C360",
    stageFound: "after-final-plate",
    stack: [
      { metal: "Cu", thicknessUm: 1 },
      { metal: "Ni", thicknessUm: 5 },
      { metal: "Au", thicknessUm: 0.9, thicknessLowUm: 0.6, thicknessHighUm: 1.2 },
    ],
  },
  { rates: STARTING_RATES, table: SHIPPED_STRIP_TABLE, corrections: NO_CORRECTIONS },
);
const END_CENTS = scaleEndCents(RECKONING.offered.map((way) => way.estimate));
const RATES = { from: "1 Jun 2026", source: "made up", currency: "USD" };
const CORRECTION = "Not enough jobs yet by electrolytic: 3 of 8";

const SECTIONS: readonly { words: string; layers: readonly Layer[] }[] = [
  { words: "One layer", layers: [{ metal: "Cu", thicknessUm: 0.5 }] },
  { words: "Flash under hard chromium", layers: [{ metal: "Ni", thicknessUm: 0.3 }, { metal: "Cr", thicknessUm: 120 }] },
  { words: "Every hatch, first half", layers: DEPOSIT_METALS.slice(0, 8).map((metal) => ({ metal, thicknessUm: 1 })) },
  { words: "Every hatch, second half", layers: DEPOSIT_METALS.slice(8).map((metal) => ({ metal, thicknessUm: 1 })) },
]; // prettier-ignore

/** The strip estimator's parts: sections, shapes, ways, and the printed sheet for the shop and for a customer. */
export function StripShelf() {
  const [way, dearer] = RECKONING.offered;
  const [refused] = RECKONING.refused;
  return (
    <>
      <Section title="Sections and shapes" rests="A hatch for each deposit and a wide one for every base metal.">
        <div className="est-shelf">
          {SECTIONS.map(({ words, layers }, index) => (
            <figure key={words}>
              <div className="est-shelf__cut">
                <CrossSection
                  layers={layers}
                  scale={sectionScale(layers.map((layer) => layer.thicknessUm))}
                  baseMetal={BASE_METALS[index * 3] ?? "other"}
                />
              </div>
              <figcaption className="small">{words}</figcaption>
            </figure>
          ))}
          {AREA_SHAPES.map((shape) =>
            shape === "typed" ? null : (
              <figure key={shape}>
                <ShapeDrawing shape={shape} label={AREA_SHAPE_TITLES[shape]} />
                <figcaption className="small mono">{AREA_FORMULAS[shape]}</figcaption>
              </figure>
            ),
          )}
        </div>
      </Section>
      <Section title="Ways to take it off">
        <div className="est-ways">
          {way && (
            <OfferedStripWay
              way={way}
              reckoning={RECKONING}
              endCents={END_CENTS}
              currency="USD"
              isChosen
              chosenWords="Chosen for this case"
              onPick={() => undefined}
              formId="none"
            />
          )}
          {dearer && (
            <OfferedStripWay
              way={dearer}
              reckoning={RECKONING}
              endCents={END_CENTS}
              currency="USD"
              isChosen={false}
              chosenWords=""
              onPick={() => undefined}
              formId="none"
            />
          )}
          {refused && <RefusedStripWay way={refused} baseMetal="brass" />}
          <StripBeside reckoning={RECKONING} endCents={END_CENTS} currency="USD" />
        </div>
      </Section>
      <StripSpread reckoning={RECKONING} />
      <Section title="The printed sheet, for a customer: no money">
        <StripSheet
          for="customer"
          shopName="Fernhollow Finishing"
          printedOn="14 Jul 2026"
          reckoning={RECKONING}
          ratesWords={RATES}
          correction={CORRECTION}
          origin={null}
        />
      </Section>
    </>
  );
}
