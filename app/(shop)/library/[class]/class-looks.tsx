import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { SourceMarks } from "@/components/library/source-marks";
import { TellPair } from "@/components/library/tell-pair";
import { Empty } from "@/components/ui/empty";
import { Glyph } from "@/components/ui/glyph";
import { Lead } from "@/components/ui/lead";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import { BASE_METAL_TITLES } from "@/lib/cases/case-words";
import { dayWords } from "@/lib/cases/moment-words";
import { counted } from "@/lib/cases/part-words";
import { BASELINE_CLASS } from "@/lib/library/shelf-words";
import { routes } from "@/lib/routes";
import type { LoadedClass } from "./load-class";

interface PartProps {
  loaded: LoadedClass;
}

/** How many of the shop's own words are said in the head; the rest only help the search. */
const WORDS_SAID = 6;

/** Picture, name, one line, the shop's words for it, and how it stands here. */
export function ClassHead({ loaded, timeZone }: PartProps & { timeZone: string }) {
  const { entry, standing, firstAt } = loaded;
  return (
    <div className="lib-top">
      <Glyph name={classGlyph(entry.slug)} size={168} />
      <div>
        <Lead below={entry.short}>{entry.title}</Lead>
        {entry.synonyms.length > 0 && (
          <p className="mid">People also say: {entry.synonyms.slice(0, WORDS_SAID).join(", ")}.</p>
        )}
      </div>
      <aside className="lib-top__here" aria-label="In this shop">
        <p className="lib-top__say">{standingWords(entry.slug, standing)}</p>
        {standing.cases > 0 && (
          <Link className="solo" href={routes.casebook({ class: entry.slug })}>
            Open its cases
          </Link>
        )}
        <Rests>
          Confirmed at a second look in this shop
          {firstAt.ofClass !== null && `; the first was opened on ${dayWords(firstAt.ofClass, timeZone)}`}.
        </Rests>
      </aside>
    </div>
  );
}

function standingWords(slug: string, { cases, faults, isBiggest }: LoadedClass["standing"]): string {
  if (slug === BASELINE_CLASS)
    return cases === 0 ? "No part was called sound yet" : `${counted(cases, "part")} called sound`;
  if (cases === 0) return "No case of it here yet";
  return `${isBiggest ? "Your biggest fault: " : ""}${cases} of ${counted(faults, "case")}`;
}

/** The photos that seniors chose. */
export function Exemplars({ loaded: { exemplars, entry } }: PartProps) {
  if (exemplars.length === 0) {
    return (
      <Section title="At its clearest">
        <Empty title="No exemplar chosen yet.">A senior tech chooses one on a confirmed case.</Empty>
      </Section>
    );
  }
  return (
    <Section
      title="At its clearest"
      aside={<Link href={routes.casebook({ class: entry.slug, exemplars: "only" })}>All exemplars of it</Link>}
      rests="Chosen by seniors of this shop among its confirmed photos."
    >
      <ul className="lib-shots">
        {exemplars.map((each, index) => (
          <li key={each.photoId}>
            <PhotoFrame
              ratio="3 / 2"
              src={routes.photo(each.photoId, "view")}
              alt={`${entry.title} on ${BASE_METAL_TITLES[each.baseMetal].toLowerCase()}`}
              placeholder={each.placeholder}
              rendered={each.isRendered}
              eager={index === 0}
            />
            <p>
              <Link className="ref solo" href={routes.case(each.ref)}>
                {each.ref}
              </Link>{" "}
              {BASE_METAL_TITLES[each.baseMetal]}
            </p>
          </li>
        ))}
      </ul>
    </Section>
  );
}

/** At the strike, later in the final plate, and the checks that settle it. */
export function Looks({ loaded: { entry, sources } }: PartProps) {
  return (
    <Section title="What it looks like" id="looks">
      <div className="lib-thirds">
        <div>
          <h3>At the strike</h3>
          <p>{entry.atStrike}</p>
        </div>
        <div>
          <h3>Later, in the final plate</h3>
          <p>{entry.inFinalPlate}</p>
        </div>
        <div>
          <h3>Checks that settle it</h3>
          <ul className="lib-list">
            {entry.checks.map((check) => (
              <li key={check}>{check}</li>
            ))}
          </ul>
        </div>
      </div>
      <SourceMarks keys={entry.sourceKeys} sources={sources} />
    </Section>
  );
}

/** Its look-alikes, each with what tells them apart. */
export function Tells({ loaded: { entry, exemplars, tells, sources } }: PartProps) {
  if (tells.length === 0) return null;
  const isRendered = [exemplars[0], ...tells.map((tell) => tell.exemplar)].some((each) => each?.isRendered);
  return (
    <Section
      title="Tell it from"
      id="tells"
      aside={`This class on the left of each pair${isRendered ? ". Rendered demo photos" : ""}`}
    >
      <div className="tells">
        {tells.map((tell) => (
          <TellPair key={tell.slug} own={{ title: entry.title, exemplar: exemplars[0] ?? null }} tell={tell} />
        ))}
      </div>
      <SourceMarks keys={entry.sourceKeys} sources={sources} />
    </Section>
  );
}
