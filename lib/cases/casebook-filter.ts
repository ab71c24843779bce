import { dayStart, nextDay } from "@/lib/costs/period";
import { dayWords } from "./moment-words";
import { BASE_METAL_TITLES, STAGE_TITLES, type BaseMetal, type StageFound } from "./case-words";
import type { CaseStandingFilter, CasebookQuery, FilterName } from "./casebook.schema";

/** What the shop can narrow its casebook by. */
export interface CasebookChoices {
  classes: readonly { slug: string; title: string }[];
  causes: readonly { id: number; slug: string; title: string }[];
  stations: readonly { id: number; slug: string; name: string }[];
  customers: readonly { id: number; name: string }[];
  members: readonly { id: number; name: string }[];
}

/** The filters with the shop's own row numbers in place of their names. Times are UTC milliseconds. */
export interface CasebookFilter {
  classSlug?: string;
  causeId?: number;
  stationId?: number;
  baseMetal?: BaseMetal;
  stageFound?: StageFound;
  customerId?: number;
  status?: CaseStandingFilter;
  openedById?: number;
  /** Opened at or after this. */
  openedFromAt?: number;
  /** Opened before this. */
  openedUntilAt?: number;
  /** Closed at or after this. */
  closedFromAt?: number;
  /** Closed before this. */
  closedUntilAt?: number;
  /** Only those with an exemplar among their photos. */
  exemplars?: "only";
}

export interface ResolvedFilter {
  filter: CasebookFilter;
  /** How the page says each filter that is set. */
  names: Partial<Record<FilterName, string>>;
  /** Filters that name something this shop does not have. */
  unknown: FilterName[];
}

/** How a case stands, in the words of "cases that are …". */
export const STANDING_WORDS: Record<CaseStandingFilter, string> = {
  held: "on hold",
  confirmed: "confirmed, card ready",
  "in-rework": "in rework",
  closed: "closed",
  sound: "closed, sound",
  scrap: "scrapped",
  concession: "closed on concession",
  regrade: "regraded",
  released: "released, sound all along",
};

/**
 * Finds what the filters name among the shop's own classes, causes, stations, customers and crew.
 * @param timeZone the shop's; days begin there
 */
export function resolveFilter(query: CasebookQuery, choices: CasebookChoices, timeZone: string): ResolvedFilter {
  const found = {
    class: choices.classes.find((each) => each.slug === query.class),
    cause: choices.causes.find((each) => each.slug === query.cause),
    station: choices.stations.find((each) => each.slug === query.station),
    customer: choices.customers.find((each) => each.id === query.customer),
    by: choices.members.find((each) => each.id === query.by),
  };
  const named = Object.keys(found) as (keyof typeof found)[]; // the literal above has no other keys
  return {
    filter: {
      classSlug: found.class?.slug,
      causeId: found.cause?.id,
      stationId: found.station?.id,
      customerId: found.customer?.id,
      openedById: found.by?.id,
      baseMetal: query.metal,
      stageFound: query.stage,
      status: query.status,
      openedFromAt: query.openedFrom && dayStart(query.openedFrom, timeZone, "openedFrom"),
      openedUntilAt: query.openedTo && dayStart(nextDay(query.openedTo), timeZone, "openedTo"),
      exemplars: query.exemplars,
      closedFromAt: query.closedFrom && dayStart(query.closedFrom, timeZone, "closedFrom"),
      closedUntilAt: query.closedTo && dayStart(nextDay(query.closedTo), timeZone, "closedTo"),
    } as CasebookFilter, // an absent day stays undefined; "" cannot be, the schema refuses it
    names: {
      q: query.q && `“${query.q}”`,
      class: found.class?.title,
      cause: found.cause?.title,
      station: found.station?.name,
      customer: found.customer?.name,
      by: found.by?.name,
      metal: query.metal && BASE_METAL_TITLES[query.metal],
      stage: query.stage && STAGE_TITLES[query.stage],
      status: query.status && STANDING_WORDS[query.status],
      exemplars: query.exemplars && "Exemplars only",
      openedFrom: query.openedFrom && calendarDay(query.openedFrom),
      openedTo: query.openedTo && calendarDay(query.openedTo),
      closedFrom: query.closedFrom && calendarDay(query.closedFrom),
      closedTo: query.closedTo && calendarDay(query.closedTo),
    },
    unknown: named.filter((name) => query[name] !== undefined && found[name] === undefined),
  };
}

/** A day of the calendar has no time zone: it is said as it was asked. */
function calendarDay(day: string): string {
  return dayWords(Date.parse(`${day}T00:00:00Z`), "UTC");
}
