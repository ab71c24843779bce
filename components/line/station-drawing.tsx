import type { CSSProperties } from "react";
import type { StationView } from "@/lib/line/station-view";

const LEAST_LEVEL = 0.12;

/** A lamp over a bench, and the part on it. */
function Bench() {
  return (
    <svg viewBox="0 0 90 60" fill="none" stroke="currentColor" strokeWidth="2">
      <path d="M2 46H88M12 46V60M78 46V60" />
      <path d="M70 46V14L44 7" strokeLinejoin="round" />
      <path d="M31 14L42 2L52 9L36 19Z" fill="currentColor" />
      <path d="M30 22L18 43M42 22L50 43" strokeDasharray="2 4" />
      <ellipse className="metal" cx="34" cy="41.5" rx="11" ry="3.6" stroke="none" />
    </svg>
  );
}

/** An oven with two parts hung in it. */
function Oven() {
  return (
    <svg viewBox="0 0 90 60" fill="none" stroke="currentColor" strokeWidth="2">
      <path d="M4 58V8H86V58M4 58H86" />
      <path className="metal-line" d="M28 8V22M62 8V22" />
      <circle className="metal" cx="28" cy="30" r="8" stroke="none" />
      <circle className="metal" cx="62" cy="30" r="8" stroke="none" />
      <path
        d="M20 53C17 50 23 47 20 44M34 53C31 50 37 47 34 44M56 53C53 50 59 47 56 44M70 53C67 50 73 47 70 44"
        strokeLinecap="round"
      />
    </svg>
  );
}

/** A station in section: tank with its level and tint, or bench, or oven. Decorative; the words beside it say it all. */
export function StationDrawing({ station, pressed }: { station: StationView; pressed: boolean }) {
  if (station.kind === "inspect" || station.kind === "finish") {
    return (
      <span className="stn__draw stn__draw--dry" aria-hidden="true">
        {station.kind === "inspect" ? <Bench /> : <Oven />}
      </span>
    );
  }
  const level = station.flowing ? 0.92 : Math.min(1, Math.max(LEAST_LEVEL, station.level));
  const solution = { "--lvl": level, "--age": station.age } as CSSProperties;
  return (
    <span className="stn__draw" aria-hidden="true">
      {pressed && <span className="dip" />}
      <span className="tank">
        <span className={station.flowing ? "sol sol--flow" : "sol"} style={solution} />
        {!station.flowing && <span className="tank__due" />}
      </span>
      {station.held > 0 && <span className="chip-wire" />}
    </span>
  );
}
