import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import { CLASS_TITLES } from "@/lib/cases/case-words";
import type { RouteFault } from "@/lib/metals/pretreatment/route";
import { routes } from "@/lib/routes";

/** What goes wrong on this metal at the strike, each fault leading to its class. */
export function RouteFaults({ faults }: { faults: readonly RouteFault[] }) {
  return (
    <ul className="metal-faults">
      {faults.map((fault) => (
        <li key={fault.classSlug}>
          <Link href={routes.libraryClass(fault.classSlug)}>
            <Glyph name={classGlyph(fault.classSlug)} />
            {CLASS_TITLES[fault.classSlug]}
          </Link>
          <p>{fault.words}</p>
        </li>
      ))}
    </ul>
  );
}
