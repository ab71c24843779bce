import type { CauseView } from "@/components/library/cause-row";
import type { FixView } from "@/components/library/fix-card";
import type { ExemplarView, TellView } from "@/components/library/tell-pair";
import { placeholderUrl } from "@/components/photos/placeholder-url";
import type { Db } from "@/db/open";
import { countCasesByCause, countCasesByClass, listClassCards } from "@/db/queries/library";
import { getLibraryClass, type ClassPage } from "@/db/queries/library-class";
import { countClassIn, getFirstOpened, listFixTries, sumStruckIn } from "@/db/queries/library-evidence";
import { listStations } from "@/db/queries/line";
import { getRatesAt } from "@/db/queries/rates";
import { listExemplars } from "@/db/queries/second-look-against";
import { getStripTableAt } from "@/db/queries/strip-table";
import type { StationKind } from "@/lib/cases/case-words";
import { standingOf } from "@/lib/library/shelf-words";
import { byLikelihood, shareHere } from "@/lib/library/shop-share";
import { fixRecord, recordsByFix, type FixTry } from "@/lib/library/fix-record";
import { citeSources } from "@/lib/library/source-number";
import { routes } from "@/lib/routes";
import { classTrend, lastMonths } from "@/lib/library/class-trend";
import { typicalBaseMetals, typicalStrip } from "@/lib/library/typical-strip";

/** Exemplars shown of one class. */
const SHOWN = 4;

/**
 * Everything that a class's page shows; null when the shop's shelf has no such class.
 * @param stationKind only the causes that arise at this kind of station, and their fixes
 */
export function loadClass(
  db: Db,
  shopId: number,
  slug: string,
  stationKind: StationKind | null,
  clock: { now: number; timeZone: string },
) {
  const { now } = clock;
  const page = getLibraryClass(db, shopId, slug);
  if (!page) return null;
  const counts = countCasesByCause(db, shopId, slug);
  const causes = causeViews(db, shopId, page, counts);
  const shown = stationKind ? causes.filter((cause) => cause.station === stationKind) : causes;
  const rates = getRatesAt(db, shopId, now);
  const { exemplars, tells } = lookAlikes(db, shopId, page);
  return {
    entry: page.class,
    standing: standingOf(slug, countCasesByClass(db, shopId)),
    exemplars,
    tells,
    causes: shown,
    allCauses: causes.length,
    caseCount: counts.total,
    casesSinceAt: counts.firstAt,
    fixes: fixViews(page, shown, listFixTries(db, shopId, slug)),
    ...trendOf(db, shopId, slug, clock),
    sources: citeSources(usedKeys(page), page.sources),
    rates,
    strip: typicalStrip(typicalBaseMetals(page.causes), rates, getStripTableAt(db, shopId, now)),
  };
}

export type LoadedClass = NonNullable<ReturnType<typeof loadClass>>;

function causeViews(
  db: Db,
  shopId: number,
  page: ClassPage,
  counts: ReturnType<typeof countCasesByCause>,
): CauseView[] {
  const stations = listStations(db, shopId);
  const views = page.causes.map((cause) => ({
    ...cause,
    stationName: stations.find((station) => station.kind === cause.station)?.name ?? cause.station,
    here: shareHere(counts.byCause.get(cause.id) ?? 0, counts.total),
    casesHref: counts.byCause.has(cause.id) ? routes.casebook({ class: page.class.slug, cause: cause.slug }) : null,
    fixes: page.fixes.filter((fix) => fix.causeSlugs.includes(cause.slug)).map(({ slug, title }) => ({ slug, title })),
  }));
  return byLikelihood(views);
}

/** The fixes of these causes, those of the likeliest cause first. */
function fixViews(page: ClassPage, causes: readonly CauseView[], tries: readonly FixTry[]): FixView[] {
  const records = recordsByFix(tries);
  const order = [...new Set(causes.flatMap((cause) => cause.fixes.map((fix) => fix.slug)))];
  return order.flatMap((slug) => {
    const fix = page.fixes.find((each) => each.slug === slug);
    if (!fix) return [];
    const steps = fix.steps.map(({ cautionKeys, ...step }) => ({
      ...step,
      cautions: page.cautions.filter((caution) => cautionKeys.includes(caution.key)),
    }));
    const named = causes.filter((cause) => fix.causeSlugs.includes(cause.slug)).map((cause) => cause.title);
    return [{ ...fix, steps, causes: named, record: records.get(slug) ?? fixRecord([]) }];
  });
}

/** How often the class came up in the last twelve months. */
function trendOf(db: Db, shopId: number, slug: string, { now, timeZone }: { now: number; timeZone: string }) {
  const months = lastMonths(now, timeZone);
  const first = getFirstOpened(db, shopId, slug);
  const counts = { cases: countClassIn(db, shopId, slug, months), partsStruck: sumStruckIn(db, shopId, months) };
  return { trend: classTrend(months, counts, first.any), firstAt: first };
}

function usedKeys(page: ClassPage): string[] {
  const entries = [page.class, ...page.causes, ...page.fixes].flatMap((each) => each.sourceKeys);
  return [...entries, ...page.cautions.map((caution) => caution.sourceKey)];
}

interface ShownExemplar extends ExemplarView {
  ref: string;
  baseMetal: ReturnType<typeof listExemplars>[number]["baseMetal"];
}

function lookAlikes(db: Db, shopId: number, page: ClassPage): { exemplars: ShownExemplar[]; tells: TellView[] } {
  const titles = new Map(listClassCards(db, shopId).map((card) => [card.slug, card.title]));
  const slugs = [page.class.slug, ...page.class.tells.map((tell) => tell.versus)];
  const all = listExemplars(db, shopId, slugs).map(({ placeholder, ...each }) => ({
    ...each,
    placeholder: placeholderUrl(placeholder),
  }));
  return {
    exemplars: all.filter((each) => each.classSlug === page.class.slug).slice(0, SHOWN),
    tells: page.class.tells.map(({ versus, tell }) => {
      const own = all.find((each) => each.classSlug === page.class.slug);
      const other = all.find((each) => each.classSlug === versus);
      return {
        slug: versus,
        title: titles.get(versus) ?? versus,
        tell,
        exemplar: other ?? null,
        besideHref: own && other ? routes.compare([own.ref, other.ref]) : null,
      };
    }),
  };
}
