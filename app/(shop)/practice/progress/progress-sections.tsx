import { CalibrationLines } from "@/components/practice/calibration-lines";
import { ConfusionMatrix } from "@/components/practice/confusion-matrix";
import { Empty } from "@/components/ui/empty";
import { Section } from "@/components/ui/section";
import { Slip } from "@/components/ui/slip";
import { TooFew } from "@/components/ui/too-few";
import { MEMORY_SOURCE } from "@/lib/practice/memory";
import { LEAST_CALLS, STATED_SHARE } from "@/lib/practice/progress";
import type { loadProgress } from "./load-progress";

type Progress = ReturnType<typeof loadProgress>;

const percent = (share: number) => `${Math.round(share * 100)}%`;

/** Right of called, and agreement with the second look beyond chance. */
export function ScoreSection({ progress: { score, again, kappa } }: { progress: Progress }) {
  if (score.calls < LEAST_CALLS) {
    return (
      <Section title="Score">
        <TooFew have={score.calls} need={LEAST_CALLS} what="calls">
          A score, agreement and the rest show from {LEAST_CALLS} first calls on.
        </TooFew>
      </Section>
    );
  }
  const rows = [
    {
      label: "Right at first call",
      value: `${score.right} of ${score.calls}, ${percent(score.interval.low)} to ${percent(score.interval.high)}`,
    },
    {
      label: "Agreement (kappa)",
      value: kappa.defined
        ? `${kappa.kappa.toFixed(2)} ± ${kappa.standardError.toFixed(2)}, ${kappa.word}`
        : "one class only: says nothing",
    },
    ...(again.calls > 0 ? [{ label: "Right when it came back", value: `${again.right} of ${again.calls}` }] : []),
    ...(score.cantTell > 0 ? [{ label: "Can't tell", value: `${score.cantTell}, counted neither way` }] : []),
  ];
  return (
    <Section
      title="Score"
      rests="First call on each photo against the class confirmed then. Range: 95% by Wilson. Kappa: agreement beyond chance, by Cohen, with its standard error; the word for it by Landis and Koch 1977."
    >
      <Slip rows={rows} />
    </Section>
  );
}

/** What is called what. */
export function MixUpSection({ progress: { score, confusion } }: { progress: Progress }) {
  if (score.calls + score.cantTell === 0) return null;
  return (
    <Section title="What is mixed up with what" rests={`First call on each of ${score.calls + score.cantTell} photos.`}>
      <ConfusionMatrix {...confusion} />
    </Section>
  );
}

/** How sure against how right. */
export function CalibrationSection({ progress: { score, calibration } }: { progress: Progress }) {
  if (score.calls < LEAST_CALLS) return null;
  const { notches, brier } = calibration;
  const stated = `${percent(STATED_SHARE[1])}, ${percent(STATED_SHARE[2])} and ${percent(STATED_SHARE[3])}`;
  const brierWords = brier.enough
    ? ` Brier score of those shares: ${brier.score.toFixed(2)}; 0 is perfect, always "fifty-fifty" is 0.25.`
    : "";
  return (
    <Section
      title="How sure against how right"
      rests={`Box: 95% range of the share right. Dot: what the notch promises (${stated}, from memory: the dial has words, no numbers).${brierWords}`}
    >
      <CalibrationLines notches={notches} />
    </Section>
  );
}

/** What comes back when. */
export function ComingBackSection({ progress: { comingBack, answers } }: { progress: Progress }) {
  if (answers === 0) return <Empty title="Nothing was called yet." />;
  return (
    <Section
      title="What comes back when"
      rests={`${MEMORY_SOURCE}. A missed photo comes back first, a certain one last.`}
    >
      <Slip
        rows={comingBack.map(({ words, photos }) => ({
          label: words,
          value: photos === 1 ? "1 photo" : `${photos} photos`,
        }))}
      />
    </Section>
  );
}
