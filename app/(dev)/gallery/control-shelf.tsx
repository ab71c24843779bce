import { SYMPTOM_KEYS, SYMPTOMS } from "@/lib/cases/case-words";
import { Button, LinkButton } from "@/components/ui/button";
import { CheckField } from "@/components/ui/check-field";
import { Field, SelectField, TextAreaField } from "@/components/ui/field";
import { PickGroup } from "@/components/ui/pick";
import { Section } from "@/components/ui/section";
import { Stops } from "@/components/ui/stops";
import { TryOverlays } from "./try-overlays";

const CALLS = [
  { value: "underactivation", label: "Under\u00ADactivation", glyph: "underactivation" },
  { value: "dewetting", label: "Dewetting", glyph: "dewetting" },
  { value: "another", label: "Another", glyph: "own-class" },
  { value: "cannot-tell", label: "Can't tell", glyph: "not-enough" },
] as const;

/** Buttons in their states. */
export function ButtonShelf() {
  return (
    <Section title="Buttons">
      <div className="btns">
        <LinkButton variant="main" href="#main" glyph="ui-camera" keyCap="N">
          Snap a suspect part
        </LinkButton>
        <Button variant="main" busy>
          Hanging the tag
        </Button>
        <Button>Log change</Button>
        <Button variant="hold" glyph="ui-hold-tag">
          Hold
        </Button>
        <Button variant="quiet">Leave it held</Button>
        <Button aria-pressed="true" glyph="ui-step">
          In step
        </Button>
        <Button busy>Saving</Button>
        <Button disabledReason="Pick a class first.">Confirm</Button>
        <TryOverlays />
      </div>
    </Section>
  );
}

/** Fields, picks and stops. */
export function FieldShelf() {
  return (
    <Section title="Fields and picks">
      <div className="cols">
        <form className="form">
          <div className="form__pair">
            <Field label="Temperature" name="temp" unit="°C" defaultValue="54" inputMode="decimal" />
            <Field
              label="Time to first copper"
              name="time"
              unit="s"
              defaultValue="41"
              error="11 s over the 30 s window. Time it again."
            />
          </div>
          <Field label="E-mail" name="email" type="email" hint="The one your owner wrote to." placeholder="wren@…" />
          <SelectField
            label="Base metal"
            name="metal"
            optional
            placeholder="Not said"
            options={[
              { value: "brass", label: "Brass" },
              { value: "steel", label: "Steel" },
            ]}
          />
          <TextAreaField label="What you saw" name="note" defaultValue="Thin by the keyway." />
          <CheckField name="keep" label="Keep me signed in" hint="Not on the shared tablet." defaultChecked />
          <CheckField name="other" label="Write to me when a part waits" />
          <Stops name="sure" defaultValue={2} />
        </form>
        <div className="stack">
          <PickGroup
            legend="What do you see?"
            name="symptoms"
            kind="checkbox"
            defaultValue={["patchy-haze", "lifts-on-tape"]}
            options={SYMPTOM_KEYS.map((key) => ({
              value: key,
              label: SYMPTOMS[key].words,
              glyph: SYMPTOMS[key].glyph,
            }))}
          />
          <PickGroup
            legend="Your call"
            name="call"
            kind="radio"
            layout="rows"
            options={CALLS}
            defaultValue="underactivation"
            error="Say how sure you are as well."
          />
        </div>
      </div>
    </Section>
  );
}
