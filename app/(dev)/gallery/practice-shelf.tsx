import { CalibrationLines } from "@/components/practice/calibration-lines";
import { ConfusionMatrix } from "@/components/practice/confusion-matrix";
import { DrillLine } from "@/components/practice/drill-line";
import { ShopSplit, type SplitLine } from "@/components/practice/shop-split";
import { SittingHead } from "@/components/practice/sitting-head";
import { TellApart } from "@/components/practice/tell-apart";
import { Verdict } from "@/components/practice/verdict";
import { Section } from "@/components/ui/section";
import { calibrationOf, type PracticeAnswer } from "@/lib/practice/progress";
import { sittingOf } from "@/lib/practice/sitting";

const ANSWERS = [true, true, false, true, true].map((isRight, index) => ({ questionId: `q${index}`, isRight }));
const DEWETTING = { slug: "dewetting", title: "Dewetting" };
const UNDERACTIVATION = { slug: "underactivation", title: "Underactivation" };

const SPLIT: SplitLine[] = [
  { ...UNDERACTIVATION, atTheTank: 1, inPractice: 4, isConfirmed: false },
  { ...DEWETTING, atTheTank: 1, inPractice: 3, isConfirmed: true },
  { slug: null, title: "Can't tell", atTheTank: 0, inPractice: 1, isConfirmed: false },
];

const call = (isRight: boolean, sure: 1 | 2 | 3, photo: number): PracticeAnswer => ({
  photoId: `${sure}-${photo}`,
  called: isRight ? "dewetting" : "underactivation",
  confirmed: "dewetting",
  sure,
});
const CALLS = ([1, 2, 3] as const).flatMap((sure) =>
  Array.from({ length: sure === 1 ? 4 : 14 }, (_, photo) => call(photo % 3 !== 0, sure, photo)),
);

/** Practice: the sitting, what came of a call, how an eye stands. */
export function PracticeShelf() {
  return (
    <Section title="Practice">
      <div className="cols">
        <div className="stack">
          <SittingHead sitting={sittingOf({ answers: ANSWERS, questionId: "now", size: 10, left: 40 })} />
          <SittingHead
            title="Lifts on tape, a drill with a name that wraps"
            sitting={sittingOf({ answers: ANSWERS, questionId: "q2", size: 40, left: 40 })}
          />
          <Verdict called={UNDERACTIVATION} sure={3} confirmed={DEWETTING} />
          <Verdict called={null} sure={1} confirmed={DEWETTING} />
          <TellApart
            pair={[]}
            tells={[
              { ...DEWETTING, words: "The film broke here. Copper stops in a clean curve, with a darker rim." },
              { ...UNDERACTIVATION, words: "The surface never woke up. Copper thins to a haze, and tape lifts it." },
            ]}
          />
        </div>
        <div className="stack">
          <ShopSplit lines={SPLIT} />
          <ul>
            <DrillLine
              title="Lifts on tape"
              classTitles={["Peeling", "Immersion deposit"]}
              dueWords="by 24 Dec 2026"
              isLate={false}
              standing={{ called: 4, right: 3, photos: 10, isDone: false }}
            />
            <DrillLine
              title="All of it"
              classTitles={[]}
              dueWords="by 1 Dec 2026"
              isLate
              standing={{ called: 0, right: 0, photos: 6, isDone: false }}
            />
            <DrillLine
              title="Rings and tracks"
              classTitles={["Water spots"]}
              dueWords={null}
              isLate={false}
              standing={{ called: 10, right: 7, photos: 10, isDone: true }}
            />
          </ul>
          <CalibrationLines notches={calibrationOf(CALLS).notches} />
        </div>
      </div>
      <ConfusionMatrix
        classes={["dewetting", "underactivation", "peeling", "tumble-scuff"]}
        titles={["Dewetting", "Underactivation", "Peeling", "Tumble scuff"]}
        table={[
          [7, 5, 0, 0],
          [2, 9, 1, 0],
          [0, 0, 4, 0],
          [0, 1, 0, 2],
        ]}
        cantTell={[0, 2, 0, 0]}
      />
    </Section>
  );
}
