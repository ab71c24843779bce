import { AlikeCases } from "@/components/cases/alike-cases";
import { BesideBox, BesideProvider } from "@/components/cases/beside-picks";
import { BesideTray } from "@/components/cases/beside-tray";
import { TrendRow } from "@/components/library/class-trend";
import { FixRecordView } from "@/components/library/fix-record";
import { TellsBetweenList } from "@/components/library/tells-between";
import { Section } from "@/components/ui/section";
import { classTrend, lastMonths } from "@/lib/library/class-trend";
import { workedWords } from "@/lib/library/evidence-words";
import { fixRecord, type FixTry } from "@/lib/library/fix-record";

const TRAY = [
  { ref: "CT-2606-0117", classWords: "Underactivation", photoId: null },
  { ref: "CT-2605-0060", classWords: "Dewetting", photoId: null },
  { ref: "CT-2605-0071", classWords: "Immersion deposit with a long name of the shop's own", photoId: null },
  { ref: "CT-2605-0044", classWords: "Dewetting", photoId: null },
];
const MONTHS = lastMonths(Date.UTC(2026, 6, 14), "UTC");
const YEAR = {
  cases: [1, 0, 2, 3, 1, 0, 4, 6, 2, 5, 12, 3],
  partsStruck: [0, 0, 0, 0, 240, 310, 280, 300, 290, 330, 310, 140],
};
const TRENDS = [
  { title: "A full year", trend: classTrend(MONTHS, YEAR, 0) },
  {
    title: "A young shop",
    trend: classTrend(MONTHS, { cases: [0, 0, 0, 0, 0, 0, 0, 0, 0, 1, 2, 1], partsStruck: [] }, Date.UTC(2026, 3, 9)),
  },
  { title: "None", trend: classTrend(MONTHS, { cases: [], partsStruck: [] }, 0) },
];

const triesOf = (sound: number, failed: number): FixTry[] =>
  Array.from({ length: sound + failed }, (_, index) => ({
    fixSlug: "polish",
    ref: `CT-2607-${String(index + 1).padStart(4, "0")}`,
    round: index === 0 ? 2 : 1,
    outcome: index % 4 === 1 && failed > 0 ? "same-fault" : "sound",
    spentMinutes: 18 + index,
  }));
const RECORDS = [fixRecord(triesOf(15, 5)), fixRecord(triesOf(2, 1)), fixRecord([])];

/** What trainees learn by: the tray in its states, tells, trends, records of fixes, most alike cases. */
export function LearningShelf() {
  return (
    <>
      <Section title="The tray of cases">
        {/* Pressing a tick leads to the casebook: the tray lives in its address. */}
        <BesideProvider refs={TRAY.slice(0, 3).map((each) => each.ref)} address={{}}>
          <BesideBox caseRef="CT-2606-0117" />
          <BesideTray known={TRAY} onPage={["CT-2606-0117"]} />
        </BesideProvider>
        <TellsBetweenList
          pairs={[
            {
              one: { slug: "dewetting", title: "Dewetting", tell: "An island has an edge you could trace." },
              other: { slug: "underactivation", title: "Underactivation", tell: "The edge fades." },
            },
            {
              one: { slug: "dewetting", title: "Dewetting", tell: null },
              other: { slug: "oxidation", title: "Oxidation", tell: null },
            },
          ]}
        />
      </Section>
      <Section title="Trend of a class">
        {TRENDS.map(({ title, trend }) => (
          <div key={title} className="stack">
            <p className="small quiet">{title}</p>
            <TrendRow trend={trend} hrefFor={(month) => `/gallery?from=${month.from}`} />
          </div>
        ))}
      </Section>
      <Section title="What a fix did here">
        <div className="cols">
          {RECORDS.map((record) => (
            <div key={record.tries.length} className="stack">
              <p className="small quiet">{workedWords(record)}</p>
              <FixRecordView record={record} />
            </div>
          ))}
        </div>
      </Section>
      <Section title="Most alike">
        <AlikeCases
          caseRef="CT-2607-0042"
          alike={TRAY.map(({ ref, classWords }) => ({
            ref,
            classWords,
            photo: null,
            why: "Same class, shares patchy, hazy; lifts on tape, brass too, found at the strike",
          }))}
        />
      </Section>
    </>
  );
}
