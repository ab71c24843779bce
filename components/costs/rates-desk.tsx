"use client";

import { useActionState, useState, type ReactNode } from "react";
import { ExamplePicks } from "@/components/costs/example-picks";
import { RatesForm, type RatesFormProps, type RatesGroup, type SetAnswer } from "@/components/costs/rates-form";
import { RatesPreviewView } from "@/components/costs/rates-preview";
import { RatesTimeline, type RatesMark } from "@/components/costs/rates-timeline";
import { Button } from "@/components/ui/button";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import type { ActState } from "@/lib/act-state";
import { RATE_FIELDS, type RateFigures } from "@/lib/costs/rate-fields";
import type { NamedExample, RatesBench } from "@/lib/costs/rates-bench";
import { previewRates, type RatesPreview } from "@/lib/costs/rates-preview";
import { namedChanges, ratesLead, shortDayWords, startDayWords, waitWords } from "@/lib/costs/rates-preview-words";
import { readRates } from "@/lib/costs/typed-rates";
import { InputError } from "@/lib/input-error";

export interface RatesDeskProps extends Pick<RatesFormProps, "id" | "groups" | "today"> {
  /** The rates that hold now. */
  held: RateFigures;
  currency: string;
  bench: RatesBench;
  /** The opening sentence while nothing is typed. */
  lead: string;
  /** What stands under it. */
  below: ReactNode;
  /** Rows by day, each with its "2026-07-14". */
  marks: readonly (RatesMark & { day: string })[];
  /** "14 Jul". */
  todayWords: string;
  /** Says where the rates that hold come from. */
  aside: string;
  /** Every row there was. */
  history: ReactNode;
  action: (previous: ActState<SetAnswer>, form: FormData) => Promise<ActState<SetAnswer>>;
}

/** The rates at work: what is typed, and what it does to a rework before anything is saved. */
export function RatesDesk(props: RatesDeskProps) {
  const { id, groups, today, held, currency, bench, marks, todayWords } = props;
  const [state, send, isSending] = useActionState(props.action, null);
  const [typed, setTyped] = useState(() => startText(groups, today));
  const [tried, setTried] = useState(held);
  const reading = readTyped(typed, props);
  const changed = RATE_FIELDS.filter(({ name }) => reading.moves[name]).map(({ label }) => label);
  const [chosenId, setChosenId] = useState(bench.examples[0]?.id);
  const example = bench.examples.find((each) => each.id === chosenId) ?? bench.examples[0];
  const tryOut = example && tryRates(example, bench, held, tried);
  const day = typed.validFrom ?? "";
  const isTouched = changed.length > 0 || reading.waitsFor.length > 0;
  const lead = ratesLead({
    changed: changed.length,
    day: startDayWords(day, today),
    waitsFor: reading.waitsFor,
    later: tryOut?.preview?.later ?? null,
  });
  const draft = changed.length > 0 ? draftMark(day, namedChanges(changed)) : null;

  function onTyped(form: HTMLFormElement) {
    const next = textOf(form);
    setTyped(next);
    const { figures } = readTyped(next, props);
    if (figures) setTried(figures);
  }

  return (
    <>
      <div className="rates-head">
        <Lead>{isTouched ? lead : props.lead}</Lead>
        {props.below}
      </div>
      <RatesTimeline marks={placed(marks, draft)} today={todayWords} />
      <div className="rates-grid">
        <Section title="Set rates from a day on" aside={props.aside}>
          <RatesForm
            id={id}
            groups={groups}
            today={today}
            state={state}
            action={send}
            moves={reading.moves}
            onTyped={onTyped}
          />
        </Section>
        <Section title="What it does" aside="Before you save" className="rates-what">
          {reading.waitsFor.length > 0 && (
            <Note tone="amber" title={waitWords(reading.waitsFor)}>
              Write a number such as 56 or 56.50. Below it is as before.
            </Note>
          )}
          {example && tryOut ? (
            <>
              <ExamplePicks examples={bench.examples} chosen={example} onChoose={setChosenId} />
              {tryOut.preview ? (
                <RatesPreviewView
                  example={example}
                  preview={tryOut.preview}
                  thenHead={`From ${shortDayWords(day, today)}`}
                  currency={currency}
                  shopShare={bench.shopShare}
                  isTouched={changed.length > 0}
                />
              ) : (
                <p>{tryOut.problem}</p>
              )}
            </>
          ) : (
            <p>No case is closed and nothing was struck yet, so there is no rework to try rates on.</p>
          )}
          <StartNote day={startDayWords(day, today)} />
          <Button variant="main" type="submit" form={id} busy={isSending} className="desk-only">
            {`Save rates from ${(startDayWords(day, today) ?? "that day").replace("on ", "")}`}
          </Button>
        </Section>
        <Section title="Rows by date" aside="Latest start first" className="rates-past">
          {props.history}
        </Section>
      </div>
    </>
  );
}

function StartNote({ day }: { day: string | null }) {
  if (day === null) return null;
  return (
    <Note tone="blue" glyph="ui-clock" title={day === "today" ? "Starts today" : `Starts ${day}, 00:00`}>
      Cases held from then on use it. A mistake is corrected by a later row; no row is overwritten.
    </Note>
  );
}

type Typed = Readonly<Record<string, string>>;

function startText(groups: readonly RatesGroup[], today: string): Typed {
  const rows = groups.flatMap((group) => group.rows.map((row) => [row.name, row.value]));
  return { ...Object.fromEntries(rows), validFrom: today };
}

function textOf(form: HTMLFormElement): Typed {
  const texts = [...new FormData(form)].flatMap(([name, value]) => (typeof value === "string" ? [[name, value]] : []));
  return Object.fromEntries(texts);
}

function readTyped(typed: Typed, { held, groups }: Pick<RatesDeskProps, "held" | "groups">) {
  const mayBeEmpty = new Set(groups.flatMap(({ rows }) => rows.filter((row) => row.optional).map(({ name }) => name)));
  return readRates(
    held,
    (name) => typed[name],
    (name) => mayBeEmpty.has(name),
  );
}

function tryRates(
  example: NamedExample,
  bench: RatesBench,
  held: RateFigures,
  tried: RateFigures,
): { preview: RatesPreview; problem?: undefined } | { preview?: undefined; problem: string } {
  try {
    return { preview: previewRates(example, bench.table, held, tried) };
  } catch (error) {
    if (error instanceof InputError) return { problem: error.problem };
    throw error;
  }
}

function draftMark(day: string, words: string): RatesMark & { day: string } {
  const at = Date.parse(`${day}T12:00:00Z`);
  const from = Number.isNaN(at)
    ? "No day yet"
    : new Intl.DateTimeFormat("en-GB", { timeZone: "UTC", day: "numeric", month: "short", year: "numeric" }).format(at);
  return { id: "draft", day, from, standing: "draft", words };
}

/** The draft among the rows, by its day; after a row of the same day, as it would be. */
function placed(marks: RatesDeskProps["marks"], draft: (RatesMark & { day: string }) | null): RatesMark[] {
  if (!draft) return [...marks];
  const day = draft.day || "9999";
  const before = marks.filter((mark) => mark.standing !== "ahead" || mark.day <= day);
  return [...before, draft, ...marks.filter((mark) => !before.includes(mark))];
}
