"use client";

import { PickGroup } from "@/components/ui/pick";
import { Section } from "@/components/ui/section";
import { Stops } from "@/components/ui/stops";
import { SURENESS, SYMPTOM_KEYS, SYMPTOMS } from "@/lib/cases/case-words";
import { CANT_TELL, type SnapDraft } from "@/lib/cases/snap-draft";
import { suggestedCalls } from "@/lib/cases/suggested-calls";
import { CallPicks } from "./call-picks";

interface PartProps {
  draft: SnapDraft;
  onChange: (some: Partial<SnapDraft>) => void;
  faults: Record<string, string>;
}

/** What is seen, as picture buttons. */
export function SnapSymptoms({ draft, onChange, faults }: PartProps) {
  return (
    <Section title="What do you see?" className="snap-block">
      <PickGroup
        legend="What do you see?"
        hideLegend
        name="symptoms"
        kind="checkbox"
        value={draft.symptoms}
        options={SYMPTOM_KEYS.map((key) => ({ value: key, label: SYMPTOMS[key].words, glyph: SYMPTOMS[key].glyph }))}
        onChange={({ target }) =>
          onChange({
            symptoms: SYMPTOM_KEYS.filter((key) =>
              key === target.value ? target.checked : draft.symptoms.includes(key),
            ),
          })
        }
        error={faults.symptoms}
      />
    </Section>
  );
}

interface SnapCallProps extends PartProps {
  classes: readonly { slug: string; title: string }[];
  isTrainee: boolean;
}

/** How many classes stand beside "Can't tell" and "Another". */
const SUGGESTED = 4;

/** The first call: which class, and how sure. Who can't tell is not asked how sure. */
export function SnapCall({ classes, isTrainee, draft, onChange, faults }: SnapCallProps) {
  const slugs = classes.map((each) => each.slug);
  return (
    <Section title="Your call" className="snap-block" rests={isTrainee ? "Marked as a trainee's call." : undefined}>
      <CallPicks
        legend="Your call"
        hideLegend
        classes={classes}
        suggested={suggestedCalls(draft.symptoms, slugs, SUGGESTED)}
        value={draft.calledClass}
        onChange={(calledClass) => onChange({ calledClass })}
        error={faults.calledClass}
      />
      {draft.calledClass !== CANT_TELL && (
        <div className="snap-sure">
          <Stops
            name="sure"
            hideLegend
            value={draft.sure}
            onChange={({ target }) =>
              onChange({ sure: SURENESS.find((notch) => String(notch) === target.value) ?? null })
            }
            error={faults.sure}
          />
        </div>
      )}
    </Section>
  );
}
