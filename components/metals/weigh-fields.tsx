"use client";

import { BalanceDrawing, BeakerDrawing } from "@/components/metals/weigh-drawings";
import { Field } from "@/components/ui/field";
import { PickGroup } from "@/components/ui/pick";
import { Section } from "@/components/ui/section";
import { COLOURS, COLOUR_TITLES, PULLS, PULL_TITLES } from "@/lib/metals/material-words";
import { tempUnit, type CheckFaults, type CheckField, type ShopUnits, type TypedCheck } from "@/lib/metals/typed-check";

export interface WeighFieldsProps {
  typed: TypedCheck;
  units: ShopUnits;
  faults: CheckFaults;
  onType: (field: CheckField, value: string) => void;
  /** The field was left: what is wrong with it may be said. */
  onLeave: (field: CheckField) => void;
}

type NumberField = "air" | "water" | "temp" | "error";

/** The two weighings, with how to do each beside its field. */
export function WeighFields({ typed, units, faults, onType, onLeave }: WeighFieldsProps) {
  const wiring = (name: NumberField) => ({
    name,
    value: typed[name],
    inputMode: "decimal" as const,
    error: faults[name],
    onChange: (event: { target: { value: string } }) => onType(name, event.target.value),
    onBlur: () => onLeave(name),
  });
  return (
    <Section title="1. Weigh it twice" aside="Dry, bare, one part">
      <div className="weigh">
        <BalanceDrawing />
        <Field label="In air" unit="g" {...wiring("air")} />
        <p>Nothing hooked on it, no tape, no water in a hole.</p>
      </div>
      <div className="weigh">
        <BeakerDrawing />
        <Field label="Hung in water" unit="g" {...wiring("water")} />
        <p>On a thin wire, all under, touching no wall. Brush off the bubbles.</p>
      </div>
      <div className="check-pair">
        <Field label="Water" unit={tempUnit(units)} {...wiring("temp")} />
        <Field label="Balance error" unit="± g" {...wiring("error")} />
      </div>
      <p className="check-hint">
        The error is one step of the balance&rsquo;s last digit, if nobody knows better. Water a few degrees off changes
        little.
      </p>
    </Section>
  );
}

const UNKNOWN = { value: "", label: "Cannot tell" };
const swatch = (colour: string) => <span className={`swatch swatch--${colour}`} aria-hidden="true" />;

/** What narrows it down: the magnet, and the colour under the surface. */
export function LookFields({ typed, faults, onType }: Omit<WeighFieldsProps, "units" | "onLeave">) {
  return (
    <Section title="2. Magnet and colour" aside="Skip what you cannot tell">
      <div className="check-looks">
        <PickGroup
          legend="Magnet pulls"
          name="pull"
          kind="radio"
          layout="bar"
          value={typed.pull}
          options={[
            ...PULLS.map((pull) => ({ value: pull, label: PULL_TITLES[pull] })),
            { value: "", label: "Not tried" },
          ]}
          onChange={(event) => onType("pull", event.target.value)}
          error={faults.pull}
        />
        <PickGroup
          legend="Colour where you filed it"
          name="colour"
          kind="radio"
          value={typed.colour}
          options={[
            ...COLOURS.map((colour) => ({ value: colour, label: COLOUR_TITLES[colour], picture: swatch(colour) })),
            { ...UNKNOWN, picture: swatch("unknown") },
          ]}
          onChange={(event) => onType("colour", event.target.value)}
          error={faults.colour}
        />
      </div>
    </Section>
  );
}
