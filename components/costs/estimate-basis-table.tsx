import { SourceMark } from "@/components/costs/source-mark";
import { DataTable } from "@/components/ui/data-table";
import { Note } from "@/components/ui/note";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import { Slip } from "@/components/ui/slip";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import { basisRows, rateRows, type BasisRow, type RatesWords } from "@/lib/costs/strip-basis";

interface StripBasisProps {
  reckoning: StripReckoning;
  rates: RatesWords;
  /** What the shop's own jobs say to the minutes. */
  correction: string;
}

/** Every figure behind the way that is shown, with its source by shape and in words. */
export function StripBasis({ reckoning, rates, correction }: StripBasisProps) {
  const own: BasisRow = { figure: "Corrected by our own jobs", value: correction, from: "Own records", kind: "shop" };
  const shopRates = rateRows(reckoning, rates);
  return (
    <Section title="What it rests on" className="est-basis">
      <DataTable
        caption="Figures behind the estimate"
        rows={[...basisRows(reckoning), own]}
        rowKey={(row) => row.figure + row.value}
        columns={[
          { key: "figure", head: "Figure", cell: (row) => row.figure },
          { key: "value", head: "Value", cell: (row) => row.value },
          { key: "from", head: "From", cell: (row) => <SourceMark source={row.from} kind={row.kind} /> },
        ]}
      />
      <details className="est-basis__rates">
        <summary>
          {shopRates.length} rates: <SourceMark source={shopRates[0]?.from ?? ""} kind={shopRates[0]?.kind} />
        </summary>
        <Slip rows={shopRates.map((row) => ({ label: row.figure, value: row.value }))} />
      </details>
      <Rests>
        Full dot: published. Open: from memory. Half: some of each. Square: this shop’s own.
        {reckoning.assumed.length > 0 && ` ${reckoning.assumed.join(" ")}`}
      </Rests>
      <Note tone="amber" title="An estimate, not a work order" className="est-basis__note">
        Read each solution’s safety data sheet. Local codes and permits for air and waste water come first.
      </Note>
    </Section>
  );
}
