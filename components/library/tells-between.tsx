import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import type { TellsBetween } from "@/lib/library/tells-between";
import { routes } from "@/lib/routes";

/** What the library says of two classes that may be taken for each other. */
export function TellsBetweenPair({ pair: { one, other } }: { pair: TellsBetween }) {
  const sides = [one, other];
  return (
    <article className="between">
      <h3>
        {one.title} or {other.title.toLowerCase()}
      </h3>
      {one.tell === null && other.tell === null ? (
        <p className="quiet">The library has no tell between these two yet.</p>
      ) : (
        <dl>
          {sides.map(
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
      )}
    </article>
  );
}
