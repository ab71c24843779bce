import { LinkButton } from "@/components/ui/button";

export interface PagerProps {
  /** How many are on the page, or the span of them: "8 of 23", "9 to 16 of 23". */
  words: string;
  nextHref?: string | null;
  nextWords?: string;
  previousHref?: string | null;
  previousWords?: string;
  /** What is paged, for readers. */
  label?: string;
}

/** Earlier and later, with the count beside. */
export function Pager(props: PagerProps) {
  const { words, nextHref, nextWords = "Show the next", previousHref, previousWords = "Back one page" } = props;
  return (
    <nav className="pager" aria-label={props.label ?? "Pages"}>
      {previousHref && (
        <LinkButton href={previousHref} glyph="ui-back" rel="prev">
          {previousWords}
        </LinkButton>
      )}
      {nextHref && (
        <LinkButton href={nextHref} rel="next">
          {nextWords}
        </LinkButton>
      )}
      <span>{words}</span>
    </nav>
  );
}
