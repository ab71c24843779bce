import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import { BASE_METAL_TITLES } from "@/lib/cases/case-words";
import type { PretreatmentRoute } from "@/lib/metals/pretreatment/route";
import { routes } from "@/lib/routes";

/** Watch-outs named on a tile; the rest are on the metal's page. */
const NAMED = 3;

/** A base metal in the index: what it asks for, and what bites it. */
export function MetalTile({ route }: { route: PretreatmentRoute }) {
  return (
    <article className="metal-tile">
      <h3>
        <Link href={routes.metalRoute(route.baseMetal)}>{BASE_METAL_TITLES[route.baseMetal]}</Link>
      </h3>
      <p>{route.summary}</p>
      <ul className="metal-tile__bites" aria-label="What bites it">
        {route.watchOuts.slice(0, NAMED).map((each) => (
          <li key={each.title}>
            <Glyph name={classGlyph(each.classSlug)} />
            {each.title}
          </li>
        ))}
      </ul>
    </article>
  );
}
