import { classGlyph } from "@/components/cases/class-glyph";
import { CauseRow } from "@/components/library/cause-row";
import type { EntryChoices } from "@/components/library/entry-choices";
import { FixCard } from "@/components/library/fix-card";
import { Glyph } from "@/components/ui/glyph";
import { SourceList, SourceMarks } from "@/components/library/source-marks";
import { BASE_METALS, type StationKind } from "@/lib/cases/case-words";
import { entryFromForm, type FormValues } from "@/lib/library/entry-form";
import { entryTitle, type DraftBody, type EntryKind } from "@/lib/library/entry-kinds";
import { LEAST_CASES } from "@/lib/library/shop-share";
import { citeSources, type CitedSource } from "@/lib/library/source-number";

interface EntryPreviewProps {
  entry: EntryKind;
  slug: string | null;
  values: FormValues;
  choices: EntryChoices;
}

/** What is typed, drawn as the class's page would show it. Blank fields are blank. */
export function EntryPreview({ entry, slug, values, choices }: EntryPreviewProps) {
  const body = entryFromForm(entry, values);
  const sources = citeSources(texts(body.sourceKeys), choices.sources);
  return (
    <div className="entry-preview">
      {entry === "class" && <ClassPreview slug={slug ?? ""} body={body} sources={sources} choices={choices} />}
      {entry === "cause" && <CausePreview body={body} sources={sources} choices={choices} />}
      {entry === "fix" && <FixPreview body={body} sources={sources} choices={choices} />}
      {sources.length > 0 && <SourceList sources={sources} />}
    </div>
  );
}

interface PartProps {
  body: DraftBody;
  sources: readonly CitedSource[];
  choices: EntryChoices;
}

function ClassPreview({ slug, body, sources, choices }: PartProps & { slug: string }) {
  const titleOf = (name: string) => choices.classes.find((each) => each.slug === name)?.title ?? name;
  return (
    <>
      <div className="entry-preview__head">
        <Glyph name={classGlyph(slug)} size={64} />
        <div>
          <p className="head">{entryTitle(body)}</p>
          <p>{text(body.short)}</p>
          {texts(body.synonyms).length > 0 && (
            <p className="mid">People also say: {texts(body.synonyms).join(", ")}.</p>
          )}
        </div>
      </div>
      <Part title="At the strike">{text(body.atStrike)}</Part>
      <Part title="Later, in the final plate">{text(body.inFinalPlate)}</Part>
      <List title="Checks at the bench" lines={texts(body.checks)} />
      {rows(body.tells).map((row, index) => (
        <Part key={index} title={`Not ${titleOf(text(row.versus)) || "chosen yet"}`}>
          {text(row.tell)}
        </Part>
      ))}
      <List title="So that it stays away" lines={texts(body.prevention)} />
      <Part title="What taking it off means">{text(body.stripNote)}</Part>
      <SourceMarks keys={texts(body.sourceKeys)} sources={sources} />
    </>
  );
}

function CausePreview({ body, sources, choices }: PartProps) {
  const kind = text(body.station);
  const station = choices.stations.find((each) => each.kind === kind);
  const metals = texts(body.baseMetals);
  return (
    <CauseRow
      sources={sources}
      cause={{
        slug: "preview",
        title: entryTitle(body),
        station: station?.kind ?? ("clean" satisfies StationKind),
        stationName: station?.name ?? "No station chosen yet",
        why: text(body.why),
        proof: text(body.proof),
        likelihood: typeof body.likelihood === "number" ? body.likelihood : 0,
        here: { enough: false, have: 0, need: LEAST_CASES },
        baseMetals: BASE_METALS.filter((metal) => metals.includes(metal)),
        sourceKeys: texts(body.sourceKeys),
        fixes: [],
      }}
    />
  );
}

function FixPreview({ body, sources, choices }: PartProps) {
  const causes = texts(body.causeSlugs);
  return (
    <FixCard
      open
      sources={sources}
      fix={{
        slug: "preview",
        title: entryTitle(body),
        steps: rows(body.steps).map((step) => ({
          title: text(step.title),
          detail: text(step.detail),
          minutes: typeof step.minutes === "number" ? step.minutes : 0,
          perPart: step.perPart === true,
          station: choices.stations.find((each) => each.kind === step.station)?.kind ?? null,
          cautions: choices.cautions.filter((caution) => texts(step.cautionKeys).includes(caution.key)),
        })),
        whenNot: text(body.whenNot),
        materials: texts(body.materials),
        sourceKeys: texts(body.sourceKeys),
        causes: choices.causes.filter((cause) => causes.includes(cause.slug)).map((cause) => cause.title),
      }}
    />
  );
}

function Part({ title, children }: { title: string; children: string }) {
  return (
    <div className="entry-preview__part">
      <h3>{title}</h3>
      <p>{children}</p>
    </div>
  );
}

function List({ title, lines }: { title: string; lines: readonly string[] }) {
  return (
    <div className="entry-preview__part">
      <h3>{title}</h3>
      <ul className="lib-list">
        {lines.map((line, index) => (
          <li key={index}>{line}</li>
        ))}
      </ul>
    </div>
  );
}

const text = (value: unknown) => (value === undefined || value === null ? "" : String(value));
const texts = (value: unknown): string[] => (Array.isArray(value) ? value.map(String) : []);
const rows = (value: unknown): DraftBody[] =>
  Array.isArray(value) ? value.filter((row): row is DraftBody => typeof row === "object" && row !== null) : [];
