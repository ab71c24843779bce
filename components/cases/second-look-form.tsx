"use client";

import Link from "next/link";
import { useReducer, useRef, useState } from "react";
import type { FormEvent, ReactNode } from "react";
import { SecondLookCard } from "@/components/cases/second-look-card";
import { CauseChoice, ClassChoice, DispositionChoice } from "@/components/cases/second-look-choices";
import { useEnterToSend } from "@/components/cases/second-look-keys";
import { useSecondLookSend, type SecondLookAction } from "@/components/cases/second-look-send";
import { TagUpright } from "@/components/cases/tag-upright";
import { Button, LinkButton } from "@/components/ui/button";
import { TextAreaField } from "@/components/ui/field";
import { Note } from "@/components/ui/note";
import { LIMITS } from "@/lib/cases/case-words";
import {
  changeForm,
  formProblems,
  formToSend,
  isRelease,
  sendWords,
  startForm,
  type SecondLookChange,
  type SecondLookForm,
  type SecondLookOffer,
} from "@/lib/cases/second-look-form";
import { routes } from "@/lib/routes";

export interface SecondLookFormProps {
  caseRef: string;
  stateWords: string;
  /** Lines under the reference: customer, parts, first call. */
  sub: ReactNode;
  /** "You made the first call": that it shows, and what it is left out of. */
  ownCall: boolean;
  offer: SecondLookOffer;
  /** Slugs that are offered at once, then the others. */
  first: readonly string[];
  rest: readonly string[];
  /** What was called: it stands chosen until the senior chooses another. */
  startWith: string | null;
  /** The money panel; left out for those who may not see it. */
  stake?: ReactNode;
  /** Where it goes on: the next case, or the queue. */
  nextHref: string;
  onConfirm: SecondLookAction;
  onRelease: SecondLookAction;
}

/** Filling in the tag: class, cause, what to do, the card. What is typed stays whatever happens to the sending. */
export function SecondLookForm(props: SecondLookFormProps) {
  const { caseRef, offer, nextHref } = props;
  const [form, onChange] = useReducer(
    (before: SecondLookForm, change: SecondLookChange) => changeForm(before, change, offer),
    props.startWith,
    startForm,
  );
  const [isTried, setTried] = useState(false);
  const element = useRef<HTMLFormElement>(null);
  const { fault, isBusy, send } = useSecondLookSend(nextHref);
  useEnterToSend(element);
  const problems = isTried ? formProblems(form, offer) : {};
  const releases = isRelease(form);

  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (isBusy || Object.keys(formProblems(form, offer)).length > 0) return;
    send({
      action: releases ? props.onRelease : props.onConfirm,
      fields: formToSend(caseRef, form, offer),
      words: `${caseRef}: ${releases ? "released as sound." : "confirmed."}`,
    });
  };

  return (
    <>
      {!releases && form.disposition === "rework" && (
        <SecondLookCard form={form} offer={offer} onChange={onChange} error={problems.steps} />
      )}
      <form
        ref={element}
        id="second-look-form"
        className="sl-form"
        aria-label={`Second look of ${caseRef}`}
        onSubmit={submit}
        noValidate
      >
        <TagUpright caseRef={caseRef} state="held" stateWords={props.stateWords} headingLevel={1} sub={props.sub}>
          <ClassChoice
            {...{ form, offer, onChange }}
            first={props.first}
            rest={props.rest}
            error={problems.classSlug}
          />
          {!releases && (
            <>
              <CauseChoice {...{ form, offer, onChange }} error={problems.causeId} />
              <DispositionChoice form={form} onChange={onChange} />
            </>
          )}
          <WhyField form={form} onChange={onChange} error={problems.why} />
          {!releases && props.stake}
          {props.ownCall && (
            <Note tone="amber" title="You made the first call">
              You may confirm it. The history shows it, and it stays out of the agreement figures.
            </Note>
          )}
          <div className="tag-foot">
            {fault && <SendFault code={fault.code} message={fault.message} caseRef={caseRef} />}
            {Object.keys(problems).length > 0 && (
              <p className="field__error" role="alert">
                {Object.values(problems).join(" ")}
              </p>
            )}
            <Button type="submit" variant="main" wide keyCap="↵" busy={isBusy}>
              {sendWords(form)}
            </Button>
            <div className="sl-alt">
              <LinkButton variant="quiet" href={nextHref} prefetch={true} keyCap="L">
                Leave it held
              </LinkButton>
              <LinkButton variant="quiet" href={routes.case(caseRef)}>
                Whole case
              </LinkButton>
            </div>
          </div>
        </TagUpright>
      </form>
    </>
  );
}

/** What became of a sending that was not saved. Nothing of the form is lost by it. */
function SendFault({ code, message, caseRef }: { code: string; message: string; caseRef: string }) {
  return (
    <Note tone="rust" title="Not saved" role="alert">
      {message} {code === "conflict" && <Link href={routes.case(caseRef)}>See the case as it is now</Link>}
      {code === "signed-out" && <Link href={routes.signIn(routes.secondLook(caseRef))}>Sign in</Link>}
    </Note>
  );
}

function whyLabel(form: SecondLookForm): string {
  if (isRelease(form)) return "What shows that it is sound";
  return form.disposition === "rework" ? "A word to the plater" : "Why it is not reworked";
}

interface WhyProps {
  form: SecondLookForm;
  onChange: (change: SecondLookChange) => void;
  error?: string;
}

/** One field for the reason, whatever it is a reason for: what was typed stays as the senior changes their mind. */
function WhyField({ form, onChange, error }: WhyProps) {
  return (
    <TextAreaField
      className="sl-why"
      label={whyLabel(form)}
      hint="Stands in the case's history."
      name="why"
      rows={2}
      maxLength={LIMITS.noteChars}
      value={form.why}
      error={error}
      onChange={(event) => onChange({ type: "why", why: event.target.value })}
    />
  );
}
