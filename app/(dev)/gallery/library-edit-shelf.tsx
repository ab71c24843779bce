"use client";

import { EntryPreview } from "@/components/library/entry-preview";
import { MergeForm } from "@/components/library/merge-form";
import { PortEntries } from "@/components/library/port-entries";
import { FieldChanges } from "@/components/library/word-diff-view";
import { Section } from "@/components/ui/section";
import type { EntryChoices } from "@/components/library/entry-choices";
import { wordDiff } from "@/lib/library/word-diff";

const CHOICES: EntryChoices = {
  classes: [{ slug: "water-spots", title: "Water spots" }],
  causes: [{ slug: "slow-drying", title: "Slow drying", of: "Water spots" }],
  cautions: [{ key: "polishing-dust", level: "caution", text: "Wet polish, or a mask: the dust is copper." }],
  sources: [{ key: "from-memory", kind: "from-memory", citation: "From memory." }],
  stations: [{ kind: "rinse", name: "Rinse 2" }],
};

const BEFORE = "Drops dry on the part and leave their salts.";
const MINE = "Drops dry on the warm part and leave their salts.";
const THEIRS = "Drops dry on the part and leave a ring of their salts.";

/** A gallery has no action: what a form would answer is in its own tests. */
const noAction = async () => null;

/** Editing the library: previews whole and blank, two editors side by side, a comparison, a file to bring in. */
export function LibraryEditShelf() {
  const entry = { pick: "cause/slow-drying@1", kind: "cause" as const, title: "Slow drying" };
  const changes = [{ name: "why", label: "Why it happens", parts: wordDiff(BEFORE, THEIRS) }];
  return (
    <Section title="Editing the library" aside="Preview, merge, compare, bring in">
      <div className="cols">
        <EntryPreview
          entry="fix"
          slug="dry-by-air"
          choices={CHOICES}
          values={{
            title: "Dry by air at once",
            causeSlugs: ["slow-drying"],
            "steps.0.title": "Blow off",
            "steps.0.detail": "Oil-free air, from the top down.",
            "steps.0.minutes": "1.5",
            "steps.0.per": "part",
            "steps.0.station": "rinse",
            "steps.0.cautionKeys": ["polishing-dust"],
            whenNot: "On parts with blind holes: spin them.",
            sourceKeys: ["from-memory"],
          }}
        />
        <EntryPreview entry="class" slug={null} choices={CHOICES} values={{}} />
      </div>
      <MergeForm
        id="gallery-merge"
        entry="cause"
        slug="slow-drying"
        draftId={1}
        theirRevision={3}
        theirName="Ines Valadares de Montalvão"
        onlyMine={["sources"]}
        onlyTheirs={["proof", "base metals at risk"]}
        clashes={[
          {
            name: "why",
            label: "Why it happens",
            base: BEFORE,
            mine: wordDiff(BEFORE, MINE),
            theirs: wordDiff(BEFORE, THEIRS),
            both: `${THEIRS}\n\n${MINE}`,
          },
        ]}
        action={noAction}
      />
      <FieldChanges changes={changes} none="" />
      <FieldChanges changes={[]} none="The two say the same." />
      <PortEntries
        from="file"
        view={{
          fresh: [{ ...entry, pick: "cause/hot-rinse@0", title: "Rinse too hot", changes: [] }],
          changed: [{ ...entry, changes }],
          same: 71,
        }}
        action={noAction}
      />
      <PortEntries from="shelf" view={{ fresh: [], changed: [], same: 231 }} action={noAction} />
    </Section>
  );
}
