import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { BakeTable } from "@/components/metals/bake-table";
import { RouteFaults } from "@/components/metals/route-faults";
import { RouteSources } from "@/components/metals/route-sources";
import { RouteSteps } from "@/components/metals/route-steps";
import { RouteVerdicts } from "@/components/metals/route-verdicts";
import { RouteWatchOuts } from "@/components/metals/route-watch-outs";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { BASE_METALS } from "@/lib/cases/case-words";
import { BAKE_STEPS, BAKE_TEMP_C } from "@/lib/metals/pretreatment/bake";
import { pretreatmentFor } from "@/lib/metals/pretreatment/pretreatment";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

interface MetalRoutePageProps {
  params: Promise<{ metal: string }>;
}

/** The route that an address names; null for a metal that has none. */
function routeAt(slug: string) {
  const metal = BASE_METALS.find((each) => each === slug);
  return metal ? pretreatmentFor(metal) : null;
}

export async function generateMetadata({ params }: MetalRoutePageProps): Promise<Metadata> {
  const route = routeAt((await params).metal);
  return { title: route ? `${route.title} · Routes` : "Routes by base metal" };
}

/** One base metal: its route, what bites it, what suits it and what does not, and where that goes wrong at the strike. */
export default async function MetalRoutePage({ params }: MetalRoutePageProps) {
  const { metal } = await params;
  const member = await guardPage("library.see", routes.metalRoute(metal));
  const route = routeAt(metal);
  if (!route) notFound();
  const { actor, counts } = shellFor(member);
  return (
    <ShopShell actor={actor} counts={counts} here="library" back={routes.metalRoutes()} className="metal-page">
      <nav className="lib-crumb no-print" aria-label="On this page">
        <Link href={routes.metalRoutes()}>Base metals</Link>
        <a href="#watch">Watch out</a>
        <a href="#activators">Activators</a>
        <a href="#strikes">Strikes</a>
        <a href="#wrong">What goes wrong</a>
        <a href="#sources">Sources</a>
      </nav>
      <Lead below={route.summary}>{route.title}</Lead>
      <div className="metal-cols">
        <Section title="Route" aside="From the bench to the strike">
          <RouteSteps route={route} />
        </Section>
        <div>
          <Section title="Watch out" id="watch">
            <RouteWatchOuts watchOuts={route.watchOuts} />
          </Section>
          <Section
            title="What goes wrong at the strike"
            id="wrong"
            rests="Common practice. Each class has its own checks."
          >
            <RouteFaults faults={route.goesWrong} />
          </Section>
          {route.baseMetal === "steel" && (
            <Section
              title="The bake, by strength"
              rests={`ASTM B850, Table 1: ${BAKE_TEMP_C.low} to ${BAKE_TEMP_C.high} °C, read in a public bake chart. An engineer sets it; the part is not safe because it was baked.`}
            >
              <BakeTable steps={BAKE_STEPS} />
            </Section>
          )}
        </div>
      </div>
      <Section title="Activators" id="activators">
        <RouteVerdicts {...route.activators} />
      </Section>
      <Section title="Strikes" id="strikes">
        <RouteVerdicts {...route.strike} />
      </Section>
      <Section title="Sources" id="sources">
        <RouteSources sources={route.notes} />
      </Section>
    </ShopShell>
  );
}
