const WAVE =
  "M0 176C10 173 10 173 30 176S65 170 85 176 120 182 140 176 175 170 195 176 230 182 250 176 285 170 305 176 340 170 360 176";
const BUBBLES = [
  { x: 240, y: 262, r: 4 },
  { x: 252, y: 238, r: 5 },
  { x: 244, y: 214, r: 3 },
  { x: 26, y: 246, r: 4 },
  { x: 20, y: 220, r: 2.6 },
  { x: 318, y: 250, r: 2.6 },
];

function Paints() {
  return (
    <defs>
      <linearGradient id="scene-bath" x1="0" y1="0" x2="0" y2="1">
        <stop offset="0" stopColor="#2E8AD2" />
        <stop offset="1" stopColor="#123F6C" />
      </linearGradient>
      <linearGradient id="scene-copper" x1="0" y1="0" x2=".9" y2="1">
        <stop offset=".3" stopColor="#F2B98F" />
        <stop offset=".55" stopColor="#D9804A" />
        <stop offset=".8" stopColor="#B35F29" />
        <stop offset="1" stopColor="#7E3D14" />
      </linearGradient>
      <linearGradient id="scene-steel" x1="0" y1="0" x2="1" y2=".8">
        <stop offset="0" stopColor="#EDF0F2" />
        <stop offset=".4" stopColor="#A3AEB7" />
        <stop offset=".62" stopColor="#7A8791" />
        <stop offset="1" stopColor="#566370" />
      </linearGradient>
      <clipPath id="scene-above">
        <path d={`${WAVE}V0H0Z`} />
      </clipPath>
      <clipPath id="scene-below">
        <path d={`${WAVE}V292H0Z`} />
      </clipPath>
    </defs>
  );
}

/** A coupon half in the strike: bare above the line, copper below. Decoration, so readers skip it. */
export function StrikeScene({ className }: { className?: string }) {
  return (
    <svg className={className} viewBox="0 26 360 266" aria-hidden="true" preserveAspectRatio="xMidYMax slice">
      <Paints />
      <path d={`${WAVE}V292H0Z`} fill="url(#scene-bath)" />
      <path d="M130 20V46" stroke="#DE8A52" strokeWidth="5" />
      <path
        d="M130 46C130 58 143 58 143 70A13 13 0 0 1 125 81"
        fill="none"
        stroke="#DE8A52"
        strokeWidth="5"
        strokeLinecap="round"
      />
      <circle cx="130" cy="172" r="88" fill="url(#scene-steel)" clipPath="url(#scene-above)" />
      <circle cx="130" cy="172" r="88" fill="url(#scene-copper)" clipPath="url(#scene-below)" />
      <g fill="none" stroke="#fff" strokeOpacity=".2">
        {[74, 58, 41, 22].map((radius) => (
          <circle key={radius} cx="130" cy="172" r={radius} />
        ))}
      </g>
      <path
        d="M58 150A76 76 0 0 1 106 100"
        fill="none"
        stroke="#fff"
        strokeOpacity=".55"
        strokeWidth="7"
        strokeLinecap="round"
      />
      <circle cx="130" cy="97" r="8.5" fill="var(--band)" />
      <path
        d="M130 46C130 58 143 58 143 70A13 13 0 0 1 134 82.5"
        fill="none"
        stroke="#DE8A52"
        strokeWidth="5"
        strokeLinecap="round"
      />
      <path d={WAVE} fill="none" stroke="#A9DBFC" strokeWidth="2.5" />
      <g fill="#CFE9FC" fillOpacity=".8">
        {BUBBLES.map(({ x, y, r }) => (
          <circle key={y} cx={x} cy={y} r={r} />
        ))}
      </g>
      <path d="M0 289H360" stroke="var(--band-edge)" strokeWidth="6" />
    </svg>
  );
}
