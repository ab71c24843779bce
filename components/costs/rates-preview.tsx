import { PreviewTable } from "@/components/costs/preview-table";
import { Rests } from "@/components/ui/rests";
import type { NamedExample } from "@/lib/costs/rates-bench";
import type { PreviewLine, PreviewStage, RatesPreview } from "@/lib/costs/rates-preview";
import { previewHeadline } from "@/lib/costs/rates-preview-words";
import { shareWords } from "@/lib/costs/share-words";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import { amountWords } from "@/lib/costs/worth-words";
import { USUAL_CHECK_SECONDS } from "@/lib/costs/check-cost";
import { formatMoney } from "@/lib/money";

export interface RatesPreviewViewProps {
  example: NamedExample;
  preview: RatesPreview;
  /** "From 1 Aug": the head of the column of what is typed. */
  thenHead: string;
  currency: string;
  shopShare: number | null;
  /** Whether any rate differs yet. */
  isTouched: boolean;
}

/** The same rework at the rates that hold and at those that are typed, line by line. */
export function RatesPreviewView(props: RatesPreviewViewProps) {
  const { example, preview, thenHead, currency, shopShare, isTouched } = props;
  const { later, atStrike } = preview;
  const table = { thenHead, currency };
  return (
    <>
      <p className="rates-what__big" aria-live="polite">
        {isTouched ? previewHeadline(preview, example.quantity, currency) : "Type a rate: this shows what it does."}
      </p>
      <PreviewTable
        {...table}
        head={methodWords(later)}
        lines={later.lines}
        stage={later}
        total={example.stageFound === "returned" ? "Sent back" : "After final plate"}
      />
      <PreviewTable
        {...table}
        head="At the strike"
        lines={strikeLines(atStrike)}
        stage={atStrike}
        total="At the strike"
      />
      <dl className="rates-what__check">
        <div>
          <dt>
            Check one part, {USUAL_CHECK_SECONDS} s<small>labour and tape, from memory</small>
          </dt>
          <dd>
            <FromTo
              now={amountWords(preview.check.nowCents, currency)}
              then={amountWords(preview.check.thenCents, currency)}
            />
          </dd>
        </div>
        {preview.breakEven && (
          <div>
            <dt>
              Checking pays above
              <small>
                share of bad parts, for these{shopShare === null ? "" : `; the shop’s is ${shareWords(shopShare)}`}
              </small>
            </dt>
            <dd>
              <FromTo now={shareWords(preview.breakEven.now)} then={shareWords(preview.breakEven.then)} />
            </dd>
          </div>
        )}
      </dl>
      <Rests>
        {example.ref
          ? `Example: ${example.ref} priced again with the shop’s ways and record of today. The case itself keeps the rates of its day.`
          : `Example: ${example.note}; as many parts as a run usually holds.`}{" "}
        Means; the 90% range moves from {rangeWords(later.now, currency)} to {rangeWords(later.then, currency)}.
      </Rests>
    </>
  );
}

function FromTo({ now, then }: { now: string; then: string }) {
  if (now === then) return then;
  return (
    <>
      {now} to <b>{then}</b>
    </>
  );
}

function methodWords({ now, then }: PreviewStage): string {
  const [from, to] = [STRIP_METHOD_TITLES[now.method], STRIP_METHOD_TITLES[then.method]];
  return from === to ? from : `${from}, then ${to.toLowerCase()}`;
}

function rangeWords({ low90Cents, high90Cents }: PreviewStage["now"], currency: string): string {
  const money = (cents: number) => formatMoney(cents, currency, { whole: true });
  return `${money(low90Cents)}–${money(high90Cents)}`;
}

/** At the strike the small lines stand together. */
function strikeLines({ lines }: PreviewStage): PreviewLine[] {
  const isShown = ({ key }: PreviewLine) => key === "labour" || key === "line" || key === "scrapRisk";
  const small = lines.filter((line) => !isShown(line));
  const [first] = small;
  if (!first) return lines;
  const gathered: PreviewLine = {
    key: first.key,
    name: "Metal, solution, waste",
    nowCents: small.reduce((sum, line) => sum + line.nowCents, 0),
    thenCents: small.reduce((sum, line) => sum + line.thenCents, 0),
  };
  const shown = lines.filter(isShown);
  return [
    ...shown.filter(({ key }) => key !== "scrapRisk"),
    gathered,
    ...shown.filter(({ key }) => key === "scrapRisk"),
  ];
}
