import { CasebookChips, type FilterChip } from "@/components/cases/casebook-chips";
import { LinkButton } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Note } from "@/components/ui/note";
import { dropWords } from "@/lib/cases/casebook-words";
import { routes } from "@/lib/routes";

/** Names the parts of the address that this shop has nothing for. */
export function LeftOut({ names }: { names: readonly string[] }) {
  if (names.length === 0) return null;
  return (
    <Note tone="amber" title="Part of this link was left out" className="mt-4">
      This shop has nothing that fits {names.join(", ")} as the link says it. Choose it anew in the words.
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
