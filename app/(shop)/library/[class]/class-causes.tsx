import { CauseRow } from "@/components/library/cause-row";
import { FixCard } from "@/components/library/fix-card";
import { SourceMarks } from "@/components/library/source-marks";
import { Empty } from "@/components/ui/empty";
import { Section } from "@/components/ui/section";
import { TooFew } from "@/components/ui/too-few";
import { MOST_BY_CAUSE } from "@/db/queries/library";
import { dayWords } from "@/lib/cases/moment-words";
import { counted } from "@/lib/cases/part-words";
import { BASELINE_CLASS } from "@/lib/library/shelf-words";
import { LEAST_CASES } from "@/lib/library/shop-share";
import { routes } from "@/lib/routes";
import type { LoadedClass } from "./load-class";

interface CausesProps {
  loaded: LoadedClass;
  /** Name of the station that narrows the page. */
  station: string | null;
  timeZone: string;
  /** Each has its way to the editor. */
  canEdit: boolean;
}

/** The causes by likelihood: this shop's share beside the shelf's. */
export function Causes({ loaded, station, timeZone, canEdit }: CausesProps) {
  const { causes, allCauses, caseCount, casesSinceAt, entry, sources } = loaded;
  if (allCauses === 0) return null;
  const enough = caseCount >= LEAST_CASES;
  return (
    <Section
      title={enough ? "What causes it in this shop" : "What causes it"}
      id="causes"
      aside={`In this shop, ${counted(caseCount, "case")} with a named cause`}
      rests={`${restWords(enough, caseCount >= MOST_BY_CAUSE, casesSinceAt, timeZone)} The shelf's shares are from memory; ${percent(entry.otherLikelihood)} of its cases have another cause.`}
    >
      {!enough && (
        <TooFew have={caseCount} need={LEAST_CASES}>
          This shop's own shares show from {LEAST_CASES} cases on. Until then the order is the shelf's.
        </TooFew>
      )}
      {causes.length === 0 && station && (
        <Empty title={`No cause of it arises at ${station}.`}>Show the whole line for all {allCauses}.</Empty>
      )}
      {causes.map((cause) => (
        <CauseRow
          key={cause.slug}
          cause={cause}
          sources={sources}
          editHref={canEdit ? routes.libraryEdit("cause", cause.slug) : undefined}
        />
      ))}
    </Section>
  );
}

const percent = (share: number) => `${Math.round(share * 100)}%`;

function restWords(enough: boolean, isNewest: boolean, sinceAt: number | null, timeZone: string): string {
  if (!enough || sinceAt === null) return "";
  return `Solid bar: share of this shop's ${isNewest ? `newest ${MOST_BY_CAUSE.toLocaleString("en-US")} cases, those` : "cases"} since ${dayWords(sinceAt, timeZone)}, with its 95% range. Dashed blue: the shelf.`;
}

/** The fixes, those of the likeliest cause first. */
export function Fixes({ loaded: { fixes, allCauses, sources }, canEdit }: { loaded: LoadedClass; canEdit: boolean }) {
  if (allCauses === 0) return null;
  return (
    <Section title="What puts it right" id="fixes" aside={counted(fixes.length, "fix").replace(/fixs$/, "fixes")}>
      {fixes.map((fix, index) => (
        <FixCard
          key={fix.slug}
          fix={fix}
          sources={sources}
          open={index === 0}
          editHref={canEdit ? routes.libraryEdit("fix", fix.slug) : undefined}
        />
      ))}
    </Section>
  );
}

/** What keeps it from coming back. */
export function Prevention({ loaded: { entry, sources } }: { loaded: LoadedClass }) {
  return (
    <Section title={entry.slug === BASELINE_CLASS ? "So that it stays so" : "So that it stays away"} id="prevention">
      <ul className="lib-list lib-list--cols">
        {entry.prevention.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
      <SourceMarks keys={entry.sourceKeys} sources={sources} />
    </Section>
  );
}
