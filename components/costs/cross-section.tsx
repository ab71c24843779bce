import { useId } from "react";
import { BaseHatch, DepositHatch } from "@/components/costs/metal-hatch";
import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";
import type { SectionScale } from "@/lib/costs/section-scale";
import { figureWords } from "@/lib/costs/strip-words";
import { metalOf, type DepositMetal } from "@/lib/plating/metals";

export interface SectionLayer {
  metal: DepositMetal;
  thicknessUm: number;
}

export interface CrossSectionProps {
  /** From the base metal out. */
  layers: readonly SectionLayer[];
  /** `sectionScale` of their thicknesses. */
  scale: SectionScale;
  baseMetal: BaseMetal;
}

/** Wide enough for any drawing; what is beyond its edge is not seen. */
const REACH_PX = 1240;
/** The surface of a layer: never dead straight. The bends come back to where they began, so that they can follow on. */
const BENDS = "t26 1 24 1 24 -1 28 -1 28 0";
const WAVE = `M-13 0q13 -4 26 0${BENDS.repeat(Math.ceil(REACH_PX / 130))}`;
/** Where the base is cut short. */
const TEETH = Array.from({ length: REACH_PX / 20 }, (_, index) => `L${index * 20 + 10} -10L${index * 20 + 20} -1`).join(
  "",
);
const percent = (share: number) => `${(share * 100).toFixed(3)}%`;

/** "Section, from the top: 0.8 µm gold, 5 µm nickel, 1 µm copper, on brass." */
export function sectionWords(layers: readonly SectionLayer[], baseMetal: BaseMetal): string {
  const list = layers.toReversed().map((layer) => `${figureWords(layer.thicknessUm)} µm ${metalOf(layer.metal).name}`);
  return `Section, from the top: ${list.join(", ")}, on ${BASE_METAL_TITLES[baseMetal].toLowerCase()}.`;
}

/**
 * A deposit cut through, in the true ratio of its layers where they can be seen. It fills the box it is put in, of any
 * height; hatches and lines keep their size.
 */
export function CrossSection({ layers, scale, baseMetal }: CrossSectionProps) {
  const id = useId();
  const metals = [...new Set(layers.map((layer) => layer.metal))];
  // From the top down: each surface covers all that was drawn above it from there on.
  const drawn = layers.map((layer, index) => ({ layer, band: scale.bands[index] })).toReversed();
  return (
    <svg className="section-cut" role="img" aria-label={sectionWords(layers, baseMetal)}>
      <defs>
        {metals.map((metal) => (
          <DepositHatch key={metal} id={`${id}${metal}`} metal={metal} />
        ))}
        <BaseHatch id={`${id}base`} metal={baseMetal} />
      </defs>
      {drawn.map(({ layer, band }, index) => (
        <Surface key={`${layer.metal} ${index}`} topShare={band?.topShare ?? 0} fill={`url(#${id}${layer.metal})`} />
      ))}
      <Surface topShare={scale.base.topShare} fill={`url(#${id}base)`} />
      <svg y="100%" overflow="visible">
        <path className="section-cut__saw" d={`M0 4V-1${TEETH}V4Z`} />
      </svg>
      {scale.bar && <ScaleBar bar={scale.bar} topShare={scale.bands.at(-1)?.topShare ?? 0} />}
    </svg>
  );
}

function Surface({ topShare, fill }: { topShare: number; fill: string }) {
  return (
    <svg y={percent(topShare)} overflow="visible">
      <path d={`${WAVE}V4000H-13Z`} fill={fill} />
      <path className="section-cut__edge" d={WAVE} />
    </svg>
  );
}

/** How much a height means: only the layers that are to scale go by it. */
function ScaleBar({ bar, topShare }: { bar: { um: number; share: number }; topShare: number }) {
  const ends = { y1: percent(topShare + 0.03), y2: percent(topShare + 0.03 + bar.share) };
  return (
    <g className="section-bar" aria-hidden="true">
      <line className="section-bar__halo" x1={14} x2={14} {...ends} />
      {[ends.y1, ends.y2].map((y) => (
        <line key={y} className="section-bar__halo" x1={9} x2={19} y1={y} y2={y} />
      ))}
      <line x1={14} x2={14} {...ends} />
      {[ends.y1, ends.y2].map((y) => (
        <line key={y} x1={9} x2={19} y1={y} y2={y} />
      ))}
      <text x={25} y={percent(topShare + 0.03 + bar.share / 2)} dominantBaseline="central">
        {figureWords(bar.um)} µm
      </text>
    </g>
  );
}

/** Lines from the middle of each layer to the middle of its row: rows are as high as each other, layers are not. */
export function SectionLeaders({ scale }: { scale: SectionScale }) {
  const rows = scale.bands.length + 1;
  const middles = [...scale.bands.toReversed(), scale.base].map((band) => band.topShare + band.share / 2);
  return (
    <svg className="section-leaders" aria-hidden="true">
      {middles.map((middle, index) => (
        <line key={middle} x1="0" y1={percent(middle)} x2="100%" y2={percent((index + 0.5) / rows)} />
      ))}
    </svg>
  );
}
