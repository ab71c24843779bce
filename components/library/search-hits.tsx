import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { LinkButton } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Glyph } from "@/components/ui/glyph";
import { MarkedParts } from "@/components/ui/marked-parts";
import { hitHref } from "@/lib/library/hit-href";
import type { LibraryHit } from "@/lib/library/library-hit";
import { routes } from "@/lib/routes";

/** What each class is called, by slug. */
export type ClassTitles = Readonly<Record<string, string>>;

export interface SearchHitsProps {
  /** What was typed. */
  query: string;
  hits: readonly LibraryHit[];
  classTitles: ClassTitles;
}

const KIND_WORDS: Record<LibraryHit["kind"], string> = { class: "Class", cause: "Cause", fix: "Fix" };
const OF_WORDS: Record<LibraryHit["kind"], string> = { class: "", cause: "of", fix: "for" };

/** "Cause of Peeling and Dewetting": what the hit is, and the classes it belongs to. */
function hitWords(hit: LibraryHit, classTitles: ClassTitles): string {
  if (hit.kind === "class") return KIND_WORDS.class;
  const titles = hit.classes.map((slug) => (classTitles[slug] ?? slug).toLowerCase());
  const named = titles.length > 2 ? [...titles.slice(0, 2), `${titles.length - 2} more`] : titles;
  const list = named.length > 1 ? `${named.slice(0, -1).join(", ")} and ${named.at(-1)}` : named.join("");
  return list ? `${KIND_WORDS[hit.kind]} ${OF_WORDS[hit.kind]} ${list}` : KIND_WORDS[hit.kind];
}

/** What answered, best first. Each line says what it is and which of its words matched. */
export function SearchHits({ query, hits, classTitles }: SearchHitsProps) {
  if (hits.length === 0) {
    return (
      <Empty
        title={`Nothing in the library answers “${query}”.`}
        action={
          <LinkButton href={routes.casebook({ q: query })} prefetch={false}>
            Look in the casebook
          </LinkButton>
        }
      >
        Try one word of it: what the copper looks like, the alloy, or the tank.
      </Empty>
    );
  }
  return (
    <ol className="hits" aria-label="What the library found">
      {hits.map((hit) => (
        <li key={`${hit.kind} ${hit.slug}`}>
          <Link href={hitHref(hit)} prefetch={false}>
            <Glyph name={classGlyph(hit.classes[0] ?? null)} />
            <span className="hits__words">
              <strong>{hit.matched === hit.title ? <MarkedParts parts={hit.parts} /> : hit.title}</strong>
              <span className="hits__kind">{hitWords(hit, classTitles)}</span>
              {hit.matched !== hit.title && (
                <span className="hits__matched">
                  matched “<MarkedParts parts={hit.parts} />”
                </span>
              )}
            </span>
          </Link>
        </li>
      ))}
    </ol>
  );
}
