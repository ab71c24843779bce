import { CrossSection } from "@/components/costs/cross-section";
import { CautionList, CostLines, stepWords } from "@/components/costs/estimate-way-parts";
import { SheetWays } from "@/components/costs/estimate-sheet-ways";
import { STAGE_TITLES } from "@/lib/cases/case-words";
import { metalWords } from "@/lib/cases/part-words";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import { sectionScale } from "@/lib/costs/section-scale";
import type { RatesWords } from "@/lib/costs/strip-basis";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import { answerWords, figureWords, massWords, metalTitle, roundMoney, takingOffWords } from "@/lib/costs/strip-words";

export interface StripSheetProps {
  /** shop: with every figure. customer: what is on the parts, the ways, steps and cautions, and no money at all. */
  for: "shop" | "customer";
  shopName: string;
  printedOn: string;
  reckoning: StripReckoning;
  ratesWords: RatesWords;
  /** What the shop's own jobs say to the minutes. */
  correction: string;
  origin: { key: string; kind: "case" | "job"; customer: string; partName: string; jobNumber: string } | null;
}

/** One page of paper: the batch, its section, the ways, and what the way that is shown takes. */
export function StripSheet(props: StripSheetProps) {
  const { reckoning, ratesWords } = props;
  const isShop = props.for === "shop";
  const { chosen } = reckoning;
  // The lines stand in the shorter column, so that even twelve layers stay on one page.
  const isLong = chosen.steps.length > chosen.cautions.length;
  const lines = isShop && <CostLines estimate={chosen} batch={reckoning.batch} currency={ratesWords.currency} />;
  return (
    <article className="strip-sheet">
      <header className="strip-sheet__from">
        <p>
          <b>{props.shopName}</b>
          Strip estimate
        </p>
        <p>
          {props.origin?.kind === "case" && <span className="ref">{props.origin.key}</span>}
          {props.printedOn}
        </p>
      </header>
      <h2>{isShop ? answerWords(reckoning, ratesWords.currency) : takingOffWords(reckoning)}</h2>
      <Facts {...props} />
      <div className="strip-sheet__cols">
        <Cut reckoning={reckoning} />
        <SheetWays reckoning={reckoning} currency={ratesWords.currency} withMoney={isShop} />
      </div>
      <div className="strip-sheet__cols strip-sheet__cols--even">
        <section>
          <h3>{STRIP_METHOD_TITLES[chosen.method]}, in this order</h3>
          <ol className="est-steps">
            {chosen.steps.map((step, index) => (
              <li key={index}>
                <b>{metalTitle(step.layer.metal)}</b> {figureWords(step.layer.thicknessUm)} µm. {stepWords(step)}
              </li>
            ))}
          </ol>
          {!isLong && lines}
        </section>
        <section>
          <h3>Cautions</h3>
          <CautionList cautions={chosen.cautions} />
          {isLong && lines}
        </section>
      </div>
      <Foot {...props} />
    </article>
  );
}

function Facts({ reckoning, origin, ratesWords, for: reader }: StripSheetProps) {
  const { batch } = reckoning;
  const rows = [
    ...(origin
      ? [
          ["For", origin.customer],
          ["Job", `${origin.jobNumber}, ${origin.partName}`],
        ]
      : []),
    ["Parts", batch.quantity.toLocaleString("en-US")],
    ["Area", `${figureWords(batch.areaDm2)} dm² each, ${figureWords(batch.areaDm2 * batch.quantity)} dm² in all`],
    ["Base metal", metalWords(batch.baseMetal, batch.alloy)],
    ["Found", STAGE_TITLES[batch.stageFound]],
    ...(reader === "shop" && batch.partValueCents !== undefined
      ? [["Part value", `${roundMoney(batch.partValueCents, ratesWords.currency)} each`]]
      : []),
  ];
  return (
    <dl className="strip-sheet__facts">
      {rows.map(([label, value]) => (
        <div key={label}>
          <dt>{label}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function Cut({ reckoning }: { reckoning: StripReckoning }) {
  const { batch, layers } = reckoning;
  const scale = sectionScale(batch.stack.map((layer) => layer.thicknessUm));
  return (
    <section>
      <h3>What is on the part</h3>
      <div className="strip-sheet__cut">
        <CrossSection layers={batch.stack} scale={scale} baseMetal={batch.baseMetal} />
      </div>
      <ol className="strip-sheet__layers" reversed>
        {layers
          .map((layer, index) => (
            <li key={index}>
              <b>{metalTitle(layer.metal)}</b> {figureWords(layer.thicknessUm)} µm, {massWords(layer.massG)}
              {scale.bands[index]?.isToScale === false && ", not to scale"}
            </li>
          ))
          .toReversed()}
      </ol>
    </section>
  );
}

function Foot({ for: reader, ratesWords, correction, reckoning }: StripSheetProps) {
  return (
    <footer className="strip-sheet__foot">
      <p>
        <b>{reader === "shop" ? "Estimate, not an offer." : "How the work would be done, not an offer."}</b>{" "}
        {reader === "shop" && (
          <>
            Ranges hold nine times out of ten. Rates of {ratesWords.from} ({ratesWords.source}). {correction}.{" "}
            {reckoning.assumed.join(" ")}
          </>
        )}
      </p>
      <p>
        Not a work order. Read each solution’s safety data sheet. Local codes and permits for air and waste water come
        first. It does not say that a part is fit or safe for its use.
      </p>
    </footer>
  );
}
