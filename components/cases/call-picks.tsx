"use client";

import { useId, useState } from "react";
import { Glyph } from "@/components/ui/glyph";
import { PickGroup } from "@/components/ui/pick";
import { classGlyph } from "@/components/cases/class-glyph";
import { classWords } from "@/components/cases/class-words";
import { CANT_TELL } from "@/lib/cases/snap-draft";

export interface CallPicksProps {
  legend: string;
  hideLegend?: boolean;
  name?: string;
  /** The shop's library, in its order. */
  classes: readonly { slug: string; title: string }[];
  /** Slugs to show at once; the others open under "Another". */
  suggested: readonly string[];
  value: string | null;
  onChange: (slug: string) => void;
  error?: string;
}

/** The call as picture buttons: the likeliest classes, the rest under "Another", and "Can't tell". */
export function CallPicks(props: CallPicksProps) {
  const { legend, hideLegend, name = "calledClass", classes, suggested, value, onChange, error } = props;
  const [open, setOpen] = useState(false);
  const restId = useId();
  const isShown = value === null || value === CANT_TELL || open || suggested.includes(value);
  // What is picked stays in sight, also when the suggestions change under it.
  const first = isShown ? suggested : [value, ...suggested.slice(0, -1)];
  const option = (slug: string) => ({
    value: slug,
    label: classWords(classes.find((each) => each.slug === slug)?.title ?? slug),
    glyph: classGlyph(slug),
  });
  const rest = classes.filter((each) => !first.includes(each.slug)).map((each) => option(each.slug));
  const group = { name, kind: "radio", layout: "rows", value: value ?? "" } as const;
  const pick = (event: { target: { value: string } }) => onChange(event.target.value);
  return (
    <div className="stack-tight">
      <PickGroup
        {...group}
        legend={legend}
        hideLegend={hideLegend}
        options={[...first.map(option), { value: CANT_TELL, label: "Can't tell", glyph: classGlyph(null) }]}
        onChange={pick}
        error={error}
        more={
          rest.length > 0 && (
            <button
              type="button"
              className="pick pick--rows"
              aria-expanded={open}
              aria-controls={restId}
              onClick={() => setOpen(!open)}
            >
              <Glyph name="own-class" />
              {open ? "Fewer" : "Another"}
            </button>
          )
        }
      />
      <div id={restId} hidden={!open}>
        {open && <PickGroup {...group} legend="Another class" hideLegend options={rest} onChange={pick} />}
      </div>
    </div>
  );
}
