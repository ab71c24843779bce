"use client";

import { classGlyph, stationGlyph } from "@/components/cases/class-glyph";
import { PickGroup, type PickOption } from "@/components/ui/pick";
import { DISPOSITIONS, DISPOSITION_TITLES } from "@/lib/cases/case-words";
import {
  RELEASE,
  type SecondLookChange,
  type SecondLookForm,
  type SecondLookOffer,
} from "@/lib/cases/second-look-form";

interface ChoiceProps {
  form: SecondLookForm;
  offer: SecondLookOffer;
  onChange: (change: SecondLookChange) => void;
  error?: string;
}

const MOST_CLASS_KEYS = 9;
/** The row above the home row: beside the digits, and free of the keys of the photo. */
const CAUSE_KEYS = ["Q", "W", "E", "R", "T", "Y"];

interface ClassChoiceProps extends ChoiceProps {
  /** Slugs offered at once, then those behind "All classes". */
  first: readonly string[];
  rest: readonly string[];
}

/** The class: what was called, its look-alikes, what the shop sees most; the others one press away. */
export function ClassChoice({ form, offer, onChange, error, first, rest }: ClassChoiceProps) {
  const option = (slug: string, place: number): PickOption => ({
    value: slug,
    label: offer.classes.find((each) => each.slug === slug)?.title ?? slug,
    glyph: classGlyph(slug),
    keyCap: place < MOST_CLASS_KEYS ? String(place + 1) : undefined,
  });
  const release: PickOption = { value: RELEASE, label: "Sound, release it", glyph: "sound", keyCap: "0" };
  const common = {
    name: "classSlug",
    kind: "radio" as const,
    layout: "list" as const,
    value: form.classSlug ?? "",
    onChange: (event: { target: { value: string } }) => onChange({ type: "class", slug: event.target.value }),
  };
  return (
    <div className="choice-set">
      <PickGroup {...common} legend="Class" options={[...first.map(option), release]} error={error} />
      {rest.length > 0 && (
        <details className="all-classes">
          <summary>All classes</summary>
          <PickGroup
            {...common}
            legend="More classes"
            hideLegend
            options={rest.map((slug, index) => option(slug, first.length + index))}
          />
        </details>
      )}
    </div>
  );
}

/** The cause: those of the chosen class, with how often this shop has confirmed each. */
export function CauseChoice({ form, offer, onChange, error }: ChoiceProps) {
  const chosen = offer.classes.find((each) => each.slug === form.classSlug);
  if (!chosen) return <p className="choice-wait">Choose the class, then the cause.</p>;
  const causes = chosen.causeIds.flatMap((id) => offer.causes.find((cause) => cause.id === id) ?? []);
  if (causes.length === 0) {
    return (
      <p className="choice-wait">
        The library names no cause of {chosen.title.toLowerCase()} yet. Add one there, then come back.
      </p>
    );
  }
  const casesHere = causes.reduce((sum, cause) => sum + cause.countHere, 0);
  return (
    <PickGroup
      legend="Cause"
      legendAside={
        casesHere === 0
          ? "none confirmed here yet"
          : `in this shop, ${casesHere === 1 ? "1 case" : `${casesHere} cases`}`
      }
      name="causeId"
      kind="radio"
      layout="list"
      value={form.causeId === null ? "" : String(form.causeId)}
      onChange={(event) => onChange({ type: "cause", id: Number(event.target.value) })}
      error={error}
      options={causes.map((cause, index) => ({
        value: String(cause.id),
        label: cause.title,
        glyph: stationGlyph(cause.stationKind),
        figure: casesHere === 0 ? undefined : cause.countHere,
        keyCap: CAUSE_KEYS[index],
      }))}
    />
  );
}

/** What is to be done with the part. */
export function DispositionChoice({ form, onChange }: Pick<ChoiceProps, "form" | "onChange">) {
  return (
    <PickGroup
      legend="What to do"
      name="disposition"
      kind="radio"
      layout="bar"
      value={form.disposition}
      onChange={(event) => {
        const disposition = DISPOSITIONS.find((each) => each === event.target.value);
        if (disposition) onChange({ type: "disposition", disposition });
      }}
      options={DISPOSITIONS.map((value) => ({ value, label: DISPOSITION_TITLES[value] }))}
    />
  );
}
