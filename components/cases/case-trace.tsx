interface TracedStation {
  slug: string;
  name: string;
}

interface CaseTraceProps {
  /** "Seen at the strike. It began in the activator." */
  words: string;
  stations: readonly TracedStation[];
  /** Slug of the station where it was seen. */
  foundSlug: string;
  /** Slug of the station where it began, as far as is known. */
  tracedSlug: string | null;
  /** Under the station where it began: the age of its solution then. */
  tracedNote?: string;
  /** Under the station where it was seen: how many parts. */
  foundNote: string;
}

function classOf(index: number, from: number, seen: number): string {
  const isOnPath = from >= 0 && index >= Math.min(from, seen) && index <= Math.max(from, seen);
  return [isOnPath && "is-path", index === from && "is-from", index === seen && "is-seen"].filter(Boolean).join(" ");
}

function spoken(index: number, from: number, seen: number): string {
  if (index === from && index === seen) return "began and was seen here";
  if (index === from) return "began here";
  return index === seen ? "was seen here" : "";
}

/** The line as this fault travelled it: a diamond where it began, a ring where it was seen, dashes between. */
export function CaseTrace(props: CaseTraceProps) {
  const { words, stations, foundSlug, tracedSlug, tracedNote, foundNote } = props;
  const from = stations.findIndex((station) => station.slug === tracedSlug);
  const seen = stations.findIndex((station) => station.slug === foundSlug);
  const noteOf = (index: number) =>
    [index === from ? tracedNote : undefined, index === seen ? foundNote : undefined].filter(Boolean).join(", ");
  return (
    <section className="trace" aria-label="Where it began and where it was seen">
      <p>{words}</p>
      <ol style={{ gridTemplateColumns: `repeat(${stations.length}, minmax(0, 1fr))` }}>
        {stations.map((station, index) => (
          <li key={station.slug} className={classOf(index, from, seen)}>
            <span className="trace__name">{station.name}</span>
            <span className="sr-only"> {spoken(index, from, seen)}</span>
            {noteOf(index) && <span className="trace__note"> {noteOf(index)}</span>}
          </li>
        ))}
      </ol>
    </section>
  );
}
