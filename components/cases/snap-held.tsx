"use client";

import type { ReactNode, RefObject } from "react";
import { TagUpright } from "@/components/cases/tag-upright";
import { classGlyph } from "@/components/cases/class-glyph";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { Button, LinkButton } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import { Note } from "@/components/ui/note";
import { Slip, type SlipRow } from "@/components/ui/slip";
import { STAGE_TITLES } from "@/lib/cases/case-words";
import { callWords, firstCallWords, metalInside, partsOf } from "@/lib/cases/part-words";
import type { SnapChoices } from "@/lib/cases/same-as-last";
import { timeOfDay } from "@/lib/cases/shop-clock";
import { CANT_TELL, type SnapDraft } from "@/lib/cases/snap-draft";
import { shortName } from "@/lib/crew/initials";
import { routes } from "@/lib/routes";
import type { Held } from "./use-hang";

export interface SnapHeldProps {
  draft: SnapDraft;
  choices: SnapChoices;
  member: { name: string; timeZone: string };
  seniors: readonly string[];
  held: Held;
  /** Null until the server has given the number. */
  caseRef: string | null;
  onNext: () => void;
  headingRef: RefObject<HTMLHeadingElement | null>;
  children: ReactNode;
}

/** The tag hangs: what to do with the part, the tag to copy or print, and on to the next one. */
export function SnapHeld(props: SnapHeldProps) {
  const { caseRef, seniors, held, onNext } = props;
  const next = (className: string) => (
    <Button variant="main" glyph="ui-camera" onClick={onNext} className={className} wide>
      Snap the next part
    </Button>
  );
  return (
    <div className="snap-held">
      <div className="snap-held__head">
        <h1 ref={props.headingRef} tabIndex={-1}>
          Hold it.
          <br />
          Do not plate.
        </h1>
        <p role="status">{caseRef ? `Wire this tag to the rack. ${goesTo(seniors)}` : withoutNumber(held)}</p>
        {!caseRef && <WaitsNote held={held} />}
      </div>
      <HeldTag {...props} />
      <div className="snap-held__foot">
        {caseRef && (
          <div className="snap-held__ways">
            <LinkButton href={routes.tag(caseRef)} glyph="ui-print">
              Print
            </LinkButton>
            <LinkButton href={routes.case(caseRef)} glyph="ui-eye">
              Open case
            </LinkButton>
          </div>
        )}
        {props.children}
        {next("desk-only")}
      </div>
      <ThumbBar back="/">{next("")}</ThumbBar>
    </div>
  );
}

function withoutNumber({ waits }: Held): string {
  const when =
    waits === "no-signal" ? "when the signal is back" : waits === "slow" ? "as soon as it gets through" : "later";
  return `The tag gets its number ${when}; write HOLD on the rack tag now.`;
}

/** Who gets it: by name in a small shop. */
function goesTo(seniors: readonly string[]): string {
  if (seniors.length === 0) return "It waits for a second look.";
  if (seniors.length === 1) return `${seniors[0]} gets it now, money at risk first.`;
  return "The senior techs get it now, money at risk first.";
}

function WaitsNote({ held }: { held: Held }) {
  const stays = held.isKept
    ? "The snap and its photos are kept on this phone"
    : "Keep this page open: this browser keeps nothing";
  if (held.waits === "signed-out") {
    return (
      <Note tone="amber" title="You are signed out">
        {stays}. Sign in again and it goes up.
        <div className="note__action">
          <LinkButton href={routes.signIn(routes.snap())}>Sign in</LinkButton>
        </div>
      </Note>
    );
  }
  return (
    <Note glyph="ui-no-signal" title={WAITS_TITLES[held.waits ?? "slow"]}>
      {stays}. It goes up by itself, also while you snap the next part.
    </Note>
  );
}

const WAITS_TITLES = {
  "no-signal": "No signal at this tank",
  slow: "The signal is slow here",
  server: "The shop's server does not answer",
};

function HeldTag({ draft, choices, member, held, caseRef }: SnapHeldProps) {
  const slug = draft.calledClass === CANT_TELL ? null : draft.calledClass;
  const title = choices.classes.find((each) => each.slug === slug)?.title ?? null;
  const who = `${shortName(member.name)}, ${timeOfDay(held.at, member.timeZone)}`;
  return (
    <TagUpright caseRef={caseRef ?? "No number yet"} state="held">
      <p className="held-class">
        <Glyph name={classGlyph(slug)} />
        <span>
          Held: {callWords(title, false).toLowerCase()}
          <small>
            {firstCallWords(slug, draft.sure ?? 1)}. {who}
          </small>
        </span>
      </p>
      <Slip rows={tagRows(draft, choices)} />
      {caseRef && (
        <div className="held-qr">
          <img src={routes.tagCode(caseRef)} width={116} height={116} alt={`QR code of ${caseRef}`} />
          <p>Scan to open this case from the rack. Put the part in the hold bin, rinsed and dry.</p>
        </div>
      )}
    </TagUpright>
  );
}

function tagRows(draft: SnapDraft, choices: SnapChoices): SlipRow[] {
  const job = choices.jobs.find((each) => each.id === draft.workOrderId);
  const run = choices.runs.find((each) => each.id === draft.runId);
  const metal = metalInside(draft.baseMetal, draft.alloy);
  return [
    { label: "Job", value: job ? `${job.number} ${job.customer}` : "–" },
    { label: "Parts", value: `${partsOf(draft.quantity, run?.partsStruck ?? null)}, ${metal}` },
    ...(run ? [{ label: "Run", value: run.code }] : []),
    { label: "Found", value: STAGE_TITLES[draft.stageFound] },
  ];
}
