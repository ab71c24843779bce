import { CheckAnswer } from "@/components/metals/check-answer";
import { CheckResult } from "@/components/metals/check-result";
import { MisfitLine, MisfitNote } from "@/components/metals/misfit-line";
import { BalanceDrawing, BeakerDrawing } from "@/components/metals/weigh-drawings";
import { Section } from "@/components/ui/section";
import { declaredFit } from "@/lib/metals/declared";
import type { Misfit } from "@/lib/metals/misfit";
import { readPart } from "@/lib/metals/part-reading";
import type { CheckInput } from "@/lib/metals/typed-check";

/** A knob that weighs like zinc die cast; a part too small for its balance; one that weighs like nothing. */
const ZINC: CheckInput = {
  weightAirG: 48.6,
  weightWaterG: 41.3,
  waterTempC: 22,
  balanceErrorG: 0.1,
  pull: "none",
  colour: "blue-grey",
};
const TOO_SMALL: CheckInput = { ...ZINC, weightAirG: 12, weightWaterG: 10.6, pull: undefined, colour: undefined };
const NOTHING: CheckInput = { ...TOO_SMALL, weightAirG: 50, weightWaterG: 40.5, balanceErrorG: 0.01 };

const BRASS = { baseMetal: "brass", alloy: "C360" } as const;
const SENIORS = ["Ines"];
const KEPT = { job: "J-3318", caseRef: "CT-2607-0042" };
const MISFIT: Misfit = {
  words: "Weighs like zinc die cast, 6.64 ± 0.24 g/cm³. Declared brass C360.",
  who: "Tobias Lindqvist weighed it, 14 Jul 14:20.",
  href: "/gallery",
};

/** What a part is made of: the drawings, the result in its states, and the warning that it leaves. */
export function CheckShelf() {
  const reading = readPart(ZINC);
  const declared = declaredFit(reading.measured, BRASS.baseMetal, BRASS.alloy);
  const answer = { declared: { metal: BRASS, fit: declared }, isKindRight: false, seniors: SENIORS };
  const result = { tempTyped: "22 °C", declared };
  return (
    <Section title="Part check">
      <div className="cols">
        <div>
          <CheckResult reading={reading} {...result} balanceErrorG={0.1} />
        </div>
        <div className="stack">
          <BalanceDrawing />
          <BeakerDrawing />
          <CheckAnswer state={null} {...answer} />
          <CheckAnswer state={{ ok: true, value: { ...KEPT, fits: false } }} {...answer} />
          <CheckAnswer state={{ ok: true, value: { ...KEPT, caseRef: null, fits: true } }} {...answer} />
          <MisfitNote misfit={MISFIT} />
          <MisfitLine misfit={MISFIT} />
        </div>
        <div>
          <CheckResult reading={readPart(TOO_SMALL)} {...result} balanceErrorG={0.1} declared={null} />
        </div>
        <div>
          <CheckResult reading={readPart(NOTHING)} {...result} balanceErrorG={0.01} declared={null} />
        </div>
      </div>
    </Section>
  );
}
