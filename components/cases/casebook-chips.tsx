import Link from "next/link";
import { Glyph } from "@/components/ui/glyph";
import type { FilterName } from "@/lib/cases/casebook.schema";

export interface FilterChip {
  filter: FilterName;
  /** "Underactivation", "Snapped by Ruth Adair". */
  words: string;
  /** The casebook without it. */
  dropHref: string;
}

const BEFORE: Partial<Record<FilterName, string>> = {
  station: "Began at ",
  by: "Snapped by ",
  customer: "For ",
  openedFrom: "Opened from ",
  openedTo: "Opened by ",
  closedFrom: "Closed from ",
  closedTo: "Closed by ",
};

interface CasebookChipsProps {
  chips: readonly FilterChip[];
  clearHref: string;
  label: string;
}

/** The filters that are set; a press drops one. */
export function CasebookChips({ chips, clearHref, label }: CasebookChipsProps) {
  if (chips.length === 0) return null;
  return (
    <ul className="chips" aria-label={label}>
      {chips.map(({ filter, words, dropHref }) => (
        <li key={filter}>
          <Link className="chip-drop" href={dropHref} prefetch={false} scroll={false}>
            <span className="sr-only">Drop </span>
            <span>
              {BEFORE[filter]}
              {words}
            </span>
            <Glyph name="ui-cross" size={20} />
          </Link>
        </li>
      ))}
      {chips.length > 1 && (
        <li>
          <Link className="solo" href={clearHref} prefetch={false} scroll={false}>
            Drop them all
          </Link>
        </li>
      )}
    </ul>
  );
}
