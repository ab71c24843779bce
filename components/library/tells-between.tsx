import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import type { TellsBetween } from "@/lib/library/tells-between";
import { routes } from "@/lib/routes";

const isTold = ({ one, other }: TellsBetween) => one.tell !== null || other.tell !== null;
const names = ({ one, other }: TellsBetween) => `${one.title.toLowerCase()} and ${other.title.toLowerCase()}`;

/** What the library says of classes that may be taken for each other; pairs without a word are only named. */
export function TellsBetweenList({ pairs }: { pairs: readonly TellsBetween[] }) {
  const silent = pairs.filter((pair) => !isTold(pair));
  return (
    <>
      <div className="betweens">
        {pairs.filter(isTold).map((pair) => (
          <Pair key={names(pair)} pair={pair} />
        ))}
      </div>
      {silent.length > 0 && (
        <p className="betweens__silent">The library has no tell yet between {silent.map(names).join("; ")}.</p>
      )}
    </>
  );
}

function Pair({ pair: { one, other } }: { pair: TellsBetween }) {
  return (
    <article className="between">
      <h3>
        {one.title} or {other.title.toLowerCase()}
      </h3>
      <dl>
        {[one, other].map(
          ({ slug, title, tell }) =>
            tell !== null && (
              <div key={slug}>
                <dt>
                  <Glyph name={classGlyph(slug)} />
                  <Link href={`${routes.libraryClass(slug)}#tells`}>{title}</Link>
                </dt>
                <dd>{tell}</dd>
              </div>
            ),
        )}
      </dl>
    </article>
  );
}
