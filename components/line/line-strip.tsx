import Link from "next/link";
import type { StationView } from "@/lib/line/station-view";
import { LineStripNav } from "@/components/line/line-strip-nav";
import { StationDrawing } from "@/components/line/station-drawing";

export interface LineStripProps {
  /** full: today, library, ledger, casebook. thin: case, second look, rework. */
  mode: "full" | "thin";
  stations: readonly StationView[];
  /** Slug of the station that the screen is narrowed to. */
  pressed: string | null;
  /** The current screen narrowed to that station; null gives the whole line. Keep the other filters in it. */
  hrefFor: (station: string | null) => string;
  /** Names the strip for readers, where a page has two. */
  label?: string;
}

function Station({
  station,
  mode,
  pressed,
  href,
}: {
  station: StationView;
  mode: string;
  pressed: boolean;
  href: string;
}) {
  const held = station.held === 1 ? "1 held part traces back here" : `${station.held} held parts trace back here`;
  return (
    <li className="stn">
      <Link href={href} scroll={false} prefetch={false} aria-current={pressed ? "true" : undefined}>
        <StationDrawing station={station} pressed={pressed && mode === "full"} />
        <span className="stn__name">{station.name}</span>
        <span className={station.over ? "stn__note stn__note--over" : "stn__note"}>{station.note}</span>
        {station.held > 0 && (
          <span className="chip">
            <span aria-hidden="true">{station.held}</span>
            <span className="sr-only">{held}</span>
          </span>
        )}
      </Link>
    </li>
  );
}

/** The shop's line in section, left to right as the part travels. Pressing a station narrows the screen to it. */
export function LineStrip({ mode, stations, pressed, hrefFor, label = "The line" }: LineStripProps) {
  if (stations.length === 0) return null;
  return (
    <LineStripNav className={`line line--${mode}`} pressed={pressed} label={label}>
      <ol>
        {stations.map((station) => {
          const isPressed = station.slug === pressed;
          const href = hrefFor(isPressed ? null : station.slug);
          return <Station key={station.slug} station={station} mode={mode} pressed={isPressed} href={href} />;
        })}
      </ol>
    </LineStripNav>
  );
}
