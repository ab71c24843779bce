"use client";

import { classGlyph } from "@/components/cases/class-glyph";
import { classWords } from "@/components/cases/class-words";
import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import { Glyph } from "@/components/ui/glyph";
import { KeyCap, keyAttributes } from "@/components/ui/key-cap";
import { PickGroup } from "@/components/ui/pick";
import { Stops } from "@/components/ui/stops";
import { SubmitButton } from "@/components/ui/submit-button";
import { fieldFault, typed } from "@/lib/act-state";
import { SURENESS } from "@/lib/cases/case-words";
import { CANT_TELL } from "@/lib/cases/snap-draft";

interface ClassOnOffer {
  slug: string;
  title: string;
}

export interface QuestionFormProps {
  /** Id of the form, for the main action in the thumb bar. */
  id: string;
  questionId: string;
  /** The classes this shop sees most, shown at once. */
  first: readonly ClassOnOffer[];
  /** All others, behind "Show all". */
  rest: readonly ClassOnOffer[];
  onCall: FormAct<{ id: string }>;
}

const FIRST_KEYS = ["Q", "W", "E", "R", "T"];
const REST_KEYS = ["S", "D", "F", "G", "H", "J", "K", "L"];
const ALL_KEY = "A";
const CANT_TELL_KEY = "0";

const option = (keys: readonly string[]) => (each: ClassOnOffer, index: number) => ({
  value: each.slug,
  label: classWords(each.title),
  glyph: classGlyph(each.slug),
  keyCap: keys[index],
});

/** The call on a practice photo: class, how sure, "That's my call". Works as a plain form before script has loaded. */
export function QuestionForm({ id, questionId, first, rest, onCall }: QuestionFormProps) {
  const { state, isBusy, form } = useSend(onCall);
  const group = {
    name: "calledClass",
    kind: "radio",
    layout: "rows",
    defaultValue: typed(state, "calledClass"),
  } as const;
  const sure = SURENESS.find((notch) => String(notch) === typed(state, "sure"));
  return (
    <form
      id={id}
      {...form}
      // A second press while the first is under way would only be told that the call is in.
      onSubmit={(event) => (isBusy ? event.preventDefault() : form.onSubmit(event))}
      noValidate
      className="practice-call"
    >
      <input type="hidden" name="id" value={questionId} />
      <FaultNote state={state} title="The call was not saved" />
      <PickGroup
        {...group}
        legend="Your call"
        hideLegend
        options={[
          ...first.map(option(FIRST_KEYS)),
          { value: CANT_TELL, label: "Can't tell", glyph: classGlyph(null), keyCap: CANT_TELL_KEY },
        ]}
        error={fieldFault(state, "calledClass")}
      />
      {rest.length > 0 && (
        <details className="practice-all">
          <summary {...keyAttributes(ALL_KEY)}>
            <Glyph name="own-class" size={28} />
            {`Show all ${first.length + rest.length}`}
            <KeyCap>{ALL_KEY}</KeyCap>
          </summary>
          <PickGroup
            {...group}
            legend="Your call, the other classes"
            hideLegend
            options={rest.map(option(REST_KEYS))}
          />
        </details>
      )}
      <Stops name="sure" hideLegend withKeys defaultValue={sure} error={fieldFault(state, "sure")} />
      <div className="desk-only">
        <SubmitButton variant="main" busy={isBusy} keyCap="↵">
          That&apos;s my call
        </SubmitButton>
      </div>
    </form>
  );
}
