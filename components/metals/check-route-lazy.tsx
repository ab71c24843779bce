"use client";

import { lazy, Suspense } from "react";
import type { ReactNode } from "react";
import { PickGroup } from "@/components/ui/pick";
import { ReadingTank } from "@/components/ui/reading-tank";
import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";

/** The routes are long, and most weighings show one: the browser fetches them when it shows the first. */
const CheckRoute = lazy(async () => ({ default: (await import("@/components/metals/check-route")).CheckRoute }));

export interface OpenRouteProps {
  /** Base metals that fit, the likeliest first. */
  metals: readonly BaseMetal[];
  chosen: BaseMetal;
  onChoose: (metal: BaseMetal) => void;
  /** The route that came with the page, so that the first one needs neither script nor a wait. */
  given: { baseMetal: BaseMetal; node: ReactNode } | null;
}

/** The route of the likeliest metal, and a way to the others while several are open. */
export function OpenRoute({ metals, chosen, onChoose, given }: OpenRouteProps) {
  return (
    <>
      {metals.length > 1 && (
        <div className="check-open no-print">
          <PickGroup
            legend="Show the route for"
            name="route"
            kind="radio"
            layout="rows"
            value={chosen}
            options={metals.map((metal) => ({ value: metal, label: BASE_METAL_TITLES[metal] }))}
            onChange={(event) => {
              const metal = metals.find((each) => each === event.target.value);
              if (metal) onChoose(metal);
            }}
          />
        </div>
      )}
      {given?.baseMetal === chosen ? (
        given.node
      ) : (
        <Suspense fallback={<ReadingTank title="Fetching the route">It comes in a moment.</ReadingTank>}>
          <CheckRoute baseMetal={chosen} />
        </Suspense>
      )}
    </>
  );
}
