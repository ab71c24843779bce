import { CasebookChips, type FilterChip } from "@/components/cases/casebook-chips";
import { LinkButton } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Note } from "@/components/ui/note";
import { FILTER_NAMES, type FilterName } from "@/lib/cases/casebook.schema";
import { dropWords } from "@/lib/cases/casebook-words";
import { routes } from "@/lib/routes";

const FILTER_LABELS: Record<FilterName, string> = {
  q: "search",
  class: "class",
  cause: "cause",
  station: "station",
  metal: "base metal",
  stage: "stage found",
  customer: "customer",
  status: "state",
  by: "person who snapped it",
  openedFrom: "first day opened",
  openedTo: "last day opened",
  closedFrom: "first day",
  closedTo: "last day",
  exemplars: "exemplars",
};

/** Names the filters of the address that could not be used. */
export function LeftOut({ names }: { names: readonly string[] }) {
  const labels = FILTER_NAMES.filter((name) => names.includes(name)).map((name) => FILTER_LABELS[name]);
  if (labels.length === 0) return null;
  return (
    <Note tone="amber" title={`The link's ${labels.join(", ")} fits nothing in this shop`} className="mt-4">
      The list below goes without it. Change the words to choose it anew.
    </Note>
  );
}

interface NoCaseProps {
  chips: readonly FilterChip[];
  clearHref: string;
  /** The shop has no case at all. */
  isEmptyBook: boolean;
}

/** Nothing to show: which filter to drop, or how a first case comes in. */
export function NoCase({ chips, clearHref, isEmptyBook }: NoCaseProps) {
  if (isEmptyBook) {
    return (
      <div className="mt-8">
        <Empty
          title="The casebook is empty."
          level={2}
          action={<LinkButton href={routes.snap()}>Snap a suspect part</LinkButton>}
        >
          A case comes in here as soon as somebody hangs a hold tag.
        </Empty>
      </div>
    );
  }
  return (
    <div className="mt-8">
      <Empty
        title="No case matches."
        level={2}
        action={
          chips.length > 0 ? (
            <CasebookChips chips={chips} clearHref={clearHref} label="Filters to drop" />
          ) : (
            <LinkButton href={clearHref}>Back to the first page</LinkButton>
          )
        }
      >
        {dropWords(chips.length)}
      </Empty>
    </div>
  );
}
