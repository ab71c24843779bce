import Link from "next/link";
import { BesideBox } from "@/components/cases/beside-picks";
import { CasebookPhotos } from "@/components/cases/casebook-photos";
import { classGlyph } from "@/components/cases/class-glyph";
import { Marked } from "@/components/cases/casebook-marked";
import { TagUpright } from "@/components/cases/tag-upright";
import { Glyph } from "@/components/ui/glyph";
import type { CasebookItem } from "@/lib/cases/casebook-item";
import type { SearchTerm } from "@/lib/cases/search-query";
import { routes } from "@/lib/routes";

interface CasebookTagProps {
  item: CasebookItem;
  terms: readonly SearchTerm[];
  /** Among the first: its photos are fetched at once. */
  eager?: boolean;
  /** It lies in the tray. */
  isBeside?: boolean;
}

/** A case on the casebook's rack. */
export function CasebookTag({ item, terms, eager, isBeside }: CasebookTagProps) {
  return (
    <TagUpright
      size="card"
      as="article"
      caseRef={item.ref}
      state={item.state}
      stateWords={item.stateWords}
      progress={item.progress}
      current={isBeside}
    >
      <h2 className="tag__cls">
        <Glyph name={classGlyph(item.classSlug)} />
        <Link href={routes.case(item.ref)} prefetch={false}>
          <Marked text={item.classWords} terms={terms} />
          <span className="sr-only">, {item.ref}</span>
        </Link>
      </h2>
      <p className="tag__meta cb-meta">
        <Marked text={item.partsWords} terms={terms} />
        {item.note && (
          <>
            {". "}
            <Marked text={item.note} terms={terms} />
          </>
        )}
      </p>
      {item.foundBy && (
        <p className="cb-found">
          {item.foundBy.place}: <Marked text={item.foundBy.text} terms={terms} />
        </p>
      )}
      <CasebookPhotos item={item} eager={eager} />
      <p className="cb-foot">
        <BesideBox caseRef={item.ref} />
        <span>{item.closed ? `Closed ${item.closed}` : `Opened ${item.opened}`}</span>
        {item.cost !== null && <span className="fig">{item.cost}</span>}
      </p>
    </TagUpright>
  );
}
