import type { RouteSource } from "@/lib/metals/pretreatment/route";

/** Every source that a route names, in full, under the short name used beside the facts. */
export function RouteSources({ sources }: { sources: readonly RouteSource[] }) {
  return (
    <dl className="route-sources">
      {sources.map((source) => (
        <div key={source.name}>
          <dt>{source.name}</dt>
          <dd>{source.citation}</dd>
        </div>
      ))}
    </dl>
  );
}
