import Link from "next/link";

interface CasebookBarProps {
  view: "grid" | "table";
  gridHref: string;
  tableHref: string;
  /** "Newest first" */
  orderWords: string;
  turnWords: string;
  turnHref: string;
  /** Some of the photos were rendered for the demo. */
  isRendered: boolean;
}

/** How the cases are laid out and in which order they stand. */
export function CasebookBar(props: CasebookBarProps) {
  const { view, gridHref, tableHref, orderWords, turnWords, turnHref, isRendered } = props;
  const views = [
    { name: "grid", words: "Tags", href: gridHref },
    { name: "table", words: "Table", href: tableHref },
  ];
  return (
    <div className="cb-bar">
      <nav className="cb-views" aria-label="View">
        {views.map((each) => (
          <Link
            key={each.name}
            href={each.href}
            prefetch={false}
            scroll={false}
            aria-current={each.name === view ? "true" : undefined}
          >
            {each.words}
          </Link>
        ))}
      </nav>
      {isRendered && <p className="small quiet">Rendered demo photos</p>}
      <p className="cb-order small">
        {orderWords}.{" "}
        <Link className="solo" href={turnHref} prefetch={false} scroll={false}>
          {turnWords}
        </Link>
      </p>
    </div>
  );
}
