import type { CardProgress } from "./card-progress";
import type { CaseState } from "./case-state";
import type { BaseMetal, Closing } from "./case-words";
import { excerpt, holdsMatch } from "./matched-words";
import { dayWords } from "./moment-words";
import { callWords, counted, metalWords } from "./part-words";
import type { SearchTerm } from "./search-query";
import { tagStanding, type TagStanding } from "./tag-standing";

/** A case as the casebook draws it, all in words. */
export interface CasebookItem {
  ref: string;
  state: TagStanding["state"];
  stateWords: string;
  /** In rework: share of the steps ticked, 0 to 1. */
  progress: number;
  classSlug: string | null;
  classWords: string;
  partsWords: string;
  /** The plater's note, or the stretch of it that answered a search. */
  note: string;
  causeTitle: string | null;
  round: number;
  spentMinutes: number | null;
  opened: string;
  closed: string | null;
  /** Only for those who may see money. */
  cost: string | null;
  before: ItemPhoto | null;
  after: ItemPhoto | null;
  /** What stands where a photo of the re-strike would. */
  noAfter: string;
  /** What a search found the case by, where nothing else on the tag shows it. */
  foundBy: { place: string; text: string } | null;
}

interface ItemPhoto {
  id: string;
  isRendered: boolean;
}

interface ItemFacts {
  ref: string;
  state: CaseState;
  closing: Closing | null;
  round: number;
  heldAt: number;
  openedAt: number;
  closedAt: number | null;
  quantity: number;
  baseMetal: BaseMetal;
  alloy: string | null;
  partName: string;
  note: string;
  classSlug: string | null;
  classTitle: string | null;
  causeTitle: string | null;
  costCents: number;
}

interface ItemBeside {
  pair?: { before?: ItemPhoto; after?: ItemPhoto };
  card?: Pick<CardProgress, "steps" | "ticked"> & { spentMinutes: number };
  /** The words by which a search found it. */
  text?: Record<FoundPlace, string>;
}

interface ItemView {
  now: number;
  timeZone: string;
  /** Null keeps money out altogether. */
  money: ((cents: number) => string) | null;
  terms: readonly SearchTerm[];
}

const NOTE_LETTERS = 120;
const FOUND_LETTERS = 90;

const FOUND_PLACES = [
  ["job", "Job"],
  ["cause", "Cause"],
  ["class", "Class and what shops call it"],
  ["notes", "Note and symptoms"],
  ["ref", "Reference"],
] as const;
type FoundPlace = (typeof FOUND_PLACES)[number][0];

const NO_AFTER: Record<TagStanding["state"], string> = {
  held: "Waits for a second look",
  confirmed: "Not struck again yet",
  "in-rework": "Not struck again yet",
  "closed-sound": "No photo of the re-strike",
  scrap: "No re-strike. Scrapped",
  concession: "Left as it is",
  regrade: "Left as it is",
  released: "Was sound. Nothing to redo",
};

/** A case in words, as it stands at `view.now`. */
export function casebookItem(facts: ItemFacts, beside: ItemBeside, view: ItemView): CasebookItem {
  const { card, pair } = beside;
  const standing = tagStanding({ ...facts, card }, view.now);
  const shown = {
    classWords: callWords(facts.classTitle, facts.state !== "held"),
    partsWords: `${counted(facts.quantity, "part")}, ${facts.partName}, ${metalWords(facts.baseMetal, facts.alloy)}`,
    note: excerpt(facts.note, view.terms, NOTE_LETTERS),
  };
  return {
    ...shown,
    ref: facts.ref,
    state: standing.state,
    stateWords: standing.words,
    progress: card && card.steps > 0 ? card.ticked / card.steps : 0,
    classSlug: facts.classSlug,
    causeTitle: facts.causeTitle,
    round: facts.round,
    spentMinutes: card?.spentMinutes ?? null,
    opened: dayWords(facts.openedAt, view.timeZone),
    closed: facts.closedAt === null ? null : dayWords(facts.closedAt, view.timeZone),
    cost: view.money ? view.money(facts.costCents) : null,
    before: pair?.before ?? null,
    after: pair?.after ?? null,
    noAfter: NO_AFTER[standing.state],
    foundBy: foundBy(Object.values(shown), beside.text, view.terms),
  };
}

function foundBy(shown: string[], text: ItemBeside["text"], terms: readonly SearchTerm[]): CasebookItem["foundBy"] {
  if (!text || shown.some((words) => holdsMatch(words, terms))) return null;
  const found = FOUND_PLACES.find(([place]) => holdsMatch(text[place], terms));
  return found ? { place: found[1], text: excerpt(text[found[0]], terms, FOUND_LETTERS) } : null;
}
