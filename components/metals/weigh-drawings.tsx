/** How the two weighings are set up: on the pan, then hung on a wire in a beaker. Drawn for the eye; the words stand beside. */

const FRAME = { viewBox: "0 0 104 104", className: "weigh__drawing", "aria-hidden": true } as const;

/** The part on the pan of a balance. */
export function BalanceDrawing() {
  return (
    <svg {...FRAME}>
      <path d="M8 100H96M22 100V84H82V100" />
      <rect className="weigh__face" x="34" y="88" width="36" height="8" />
      <path d="M18 84H86M52 84V76M26 76H78" />
      <path className="weigh__part" d="M38 76C32 60 38 46 52 46S72 60 66 76Z" />
      <path className="weigh__part" d="M46 46V40H58V46" />
      <path className="weigh__glint" d="M42 62C42 56 45 52 49 51" />
    </svg>
  );
}

/** The part hung under the balance on a thin wire, all under water, clear of the walls. */
export function BeakerDrawing() {
  return (
    <svg {...FRAME}>
      <path
        className="weigh__water"
        d="M20 44C30 41 36 47 46 44S64 41 72 44S80 45 84 44V94Q84 100 78 100H26Q20 100 20 94Z"
      />
      <path d="M16 34H20V94Q20 100 26 100H78Q84 100 84 94V34H88" />
      <path className="weigh__level" d="M20 44C30 41 36 47 46 44S64 41 72 44S80 45 84 44" />
      <path className="weigh__arm" d="M4 8H100" />
      <path className="weigh__wire" d="M52 8V58" />
      <path className="weigh__part" d="M42 86C37 74 42 64 52 64S67 74 62 86Z" />
      <path className="weigh__part" d="M48 64V58H56V64" />
      <path className="weigh__gap" d="M24 78H34M27 74.5L23.5 78L27 81.5M80 78H70M77 74.5L80.5 78L77 81.5" />
    </svg>
  );
}
