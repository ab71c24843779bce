import { DataTable } from "@/components/ui/data-table";
import { Fill } from "@/components/ui/fill";
import { Gauge } from "@/components/ui/gauge";
import { Pager } from "@/components/ui/pager";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { Range } from "@/components/ui/range";
import { Section } from "@/components/ui/section";
import { Slip } from "@/components/ui/slip";
import { StateMark } from "@/components/cases/state-mark";
import { PHOTO } from "./fixtures";

const ROWS = [
  { caseRef: "CT-2606-0117", cause: "Activator past its day", parts: "12", cost: "$184" },
  { caseRef: "CT-2606-0094", cause: "Dwell too short", parts: "5", cost: "$61" },
];

/** Figures drawn: slip, gauge, range, fill, photo. */
export function FigureShelf() {
  return (
    <Section
      title="Figures and photos"
      rests="Green box: middle 90% of 63 sound strikes on brass here. Pixels, not a coating test."
    >
      <div className="cols">
        <div className="stack">
          <Slip
            rows={[
              { label: "Job", value: "J-3318 Orrin & Pike" },
              { label: "Activator", value: "A-12, 5 days over", tone: "warn" },
              { label: "Found", value: "At the strike" },
            ]}
          />
          <Gauge label="Copper cover" words="71%" value={71} low={88} high={99} usual="88 to 99%" min={0} max={100} />
          <Gauge
            label="Rings"
            words="0.1"
            value={0.1}
            low={0}
            high={0.3}
            usual="0 to 0.3"
            min={0}
            max={1}
            earlier={[0.2, 0.25]}
          />
          <Range low={24} likely={31} high={39} max={60} words={{ low: "$24", likely: "$31", high: "$39" }} />
          <Range
            low={296}
            likely={412}
            high={547}
            max={560}
            words={{ low: "$296", likely: "$412", high: "$547" }}
            estimate
          />
          <Fill label="Sending. Carry on." share={0.61} />
        </div>
        <div className="pair">
          <PhotoFrame {...PHOTO} alt="Brass shell, patchy at the rim" caption="1 of 3 · whole part" rendered />
          <PhotoFrame src={null} alt="" missing="Photo 2 is on its way" />
        </div>
      </div>
    </Section>
  );
}

/** A table with sorted head, foot, and the pager. */
export function TableShelf() {
  return (
    <Section title="Tables">
      <DataTable
        caption="Closed cases"
        rows={ROWS}
        rowKey={(row) => row.caseRef}
        columns={[
          { key: "case", head: "Case", cell: (row) => <a href="#case">{row.caseRef}</a> },
          { key: "cause", head: "Cause", cell: (row) => row.cause },
          { key: "ended", head: "Ended", cell: () => <StateMark state="closed-sound" words="Sound" /> },
          { key: "parts", head: "Parts", cell: (row) => row.parts, numeric: true, wideOnly: true },
          {
            key: "cost",
            head: "Cost",
            cell: (row) => row.cost,
            numeric: true,
            sortHref: "?sort=cost",
            sorted: "descending",
          },
        ]}
        foot={["Two cases", "", "", "17", "$245"]}
      />
      <Pager words="2 of 23" nextHref="?page=2" nextWords="Show the next 8" />
    </Section>
  );
}
