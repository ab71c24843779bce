import type { Metadata } from "next";
import Link from "next/link";
import { MetalTile } from "@/components/metals/metal-tile";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { BASE_METALS } from "@/lib/cases/case-words";
import { pretreatmentFor } from "@/lib/metals/pretreatment/pretreatment";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

export const metadata: Metadata = { title: "Routes by base metal" };

/** Every base metal that has a route, with what bites it. */
export default async function MetalRoutesPage() {
  const member = await guardPage("library.see", routes.metalRoutes());
  const { actor, counts } = shellFor(member);
  const all = BASE_METALS.flatMap((metal) => pretreatmentFor(metal) ?? []);
  return (
    <ShopShell actor={actor} counts={counts} here="library" back={routes.library()}>
      <nav className="lib-crumb no-print" aria-label="On this page">
        <Link href={routes.library()}>Library</Link>
        <Link href={routes.partCheck()}>Not sure what it is? Weigh it</Link>
      </nav>
      <Lead below="From the bench to a sound copper strike, and what bites each metal on the way.">
        Name the metal first. The route follows.
      </Lead>
      <Section
        title="Base metals"
        aside={`${all.length} routes`}
        rests="Common practice, not advice. Each step names its source. Read each solution's safety data sheet; local codes come first."
      >
        <div className="metal-tiles">
          {all.map((route) => (
            <MetalTile key={route.baseMetal} route={route} />
          ))}
        </div>
      </Section>
    </ShopShell>
  );
}
