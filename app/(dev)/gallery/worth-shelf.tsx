import { TestPieces } from "@/components/costs/test-pieces";
import { WorthCheck, type WorthCheckProps } from "@/components/costs/worth-check";
import { Section } from "@/components/ui/section";
import type { TypedTestPieces } from "@/lib/costs/test-piece-words";

const SHOP: WorthCheckProps = {
  checkCents: 53,
  checkSeconds: 30,
  checkFrom: "from memory",
  missCents: 14_793,
  missFrom: "mean of 14 own cases after the final plate",
  inspected: 14_102,
  bad: 635,
  runs: 212,
  periodWords: "in the last 91 days",
  currency: "USD",
};

const PANELS: readonly { title: string; props: WorthCheckProps }[] = [
  { title: "Check all", props: SHOP },
  { title: "Check none", props: { ...SHOP, checkCents: 120, missCents: 800, bad: 120 } },
  { title: "Too few", props: { ...SHOP, inspected: 600, bad: 3, runs: 11 } },
  { title: "Too near to tell", props: { ...SHOP, missCents: 1180, bad: 634 } },
  { title: "Nothing looked at", props: { ...SHOP, inspected: 0, bad: 0, runs: 0 } },
  { title: "None bad so far", props: { ...SHOP, inspected: 40, bad: 0, runs: 1 } },
  { title: "A check dearer than a miss", props: { ...SHOP, missCents: 40 } },
  { title: "A miss that costs nothing", props: { ...SHOP, missCents: 0 } },
];

const PIECES: TypedTestPieces = {
  badPercent: "10",
  wantedPercent: "90",
  pieceMoney: "0.50",
  faultyRunPercent: "5",
  spoiltRunMoney: "840.00",
};
const PIECE_PANELS: readonly { title: string; start: TypedTestPieces }[] = [
  { title: "They pay", start: PIECES },
  { title: "They do not", start: { ...PIECES, pieceMoney: "4.00" } },
  { title: "Bad figures", start: { ...PIECES, badPercent: "0", wantedPercent: "100" } },
];

/** Test pieces first, in every state. */
export function TestPieceShelf() {
  return (
    <Section title="A test piece first">
      <div className="cols">
        {PIECE_PANELS.map(({ title, start }) => (
          <div key={title} className="stack">
            <p className="small quiet">{title}</p>
            <TestPieces start={start} currency="USD" rests="Figures of the gallery." />
          </div>
        ))}
      </div>
    </Section>
  );
}

/** Is the check worth it, in every state. */
export function WorthShelf() {
  return (
    <Section title="Is the check worth it">
      <div className="cols">
        {PANELS.map(({ title, props }) => (
          <div key={title} className="stack">
            <p className="small quiet">{title}</p>
            <WorthCheck {...props} />
          </div>
        ))}
      </div>
    </Section>
  );
}
