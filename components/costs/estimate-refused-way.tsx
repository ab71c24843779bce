import { useId } from "react";
import { BaseHatch } from "@/components/costs/metal-hatch";
import { Glyph } from "@/components/ui/glyph";
import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";
import type { RefusedWay } from "@/lib/costs/reckon-strip";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import { SourceMark } from "@/components/costs/source-mark";
import { refusalWords } from "@/lib/costs/strip-words";
import { metalOf } from "@/lib/plating/metals";

/** A way that is not offered: the reason, and no figure, so that nobody can pick it by price. */
export function RefusedStripWay({ way, baseMetal }: { way: RefusedWay; baseMetal: BaseMetal }) {
  const { headline, reason } = refusalWords(way.why);
  const isAttack = way.refusedRow?.attacks[baseMetal] !== undefined;
  return (
    <article className="est-way est-way--no" aria-label={STRIP_METHOD_TITLES[way.method]}>
      <h3>
        <Glyph name="ui-stop" size={26} className="text-rust" />
        {STRIP_METHOD_TITLES[way.method]}
      </h3>
      <p className="est-way__no">{headline}</p>
      {way.refusedRow && (
        <p>
          The bath for {metalOf(way.layer.metal).name}: {way.refusedRow.solution}.
        </p>
      )}
      {reason && <p>{reason}</p>}
      <p className="mid">{offeredWords(way.offeredOn)}</p>
      {way.refusedRow && (
        <p className="est-way__marks">
          <SourceMark source={way.refusedRow.source} />
        </p>
      )}
      {isAttack && <PittedPart baseMetal={baseMetal} />}
      <p className="mid">No figure is worked out, so nobody can pick it by price.</p>
    </article>
  );
}

function offeredWords(metals: readonly BaseMetal[]): string {
  const names = metals.slice(0, 3).map((metal) => BASE_METAL_TITLES[metal].toLowerCase());
  if (names.length === 0) return "It is offered on no base metal for this deposit.";
  return `On ${names.length > 1 ? `${names.slice(0, -1).join(", ")} or ${names.at(-1)}` : names[0]} it would be offered.`;
}

/** The part cut through after a bath that did not stop: the plate is gone, the base metal is eaten. */
function PittedPart({ baseMetal }: { baseMetal: BaseMetal }) {
  const id = useId();
  return (
    <svg
      className="est-pits"
      viewBox="0 0 300 120"
      role="img"
      aria-label="Section: plate gone, base metal pitted at the edge"
    >
      <defs>
        <BaseHatch id={id} metal={baseMetal} />
      </defs>
      <path className="est-pits__gone" d="M2 60V16H298V94" />
      <path
        className="est-pits__part"
        fill={`url(#${id})`}
        d="M0 62C14 64 22 58 34 60S52 96 64 92 74 60 92 61 118 59 128 62 138 80 150 78 158 60 176 62 208 58 220 61 228 102 244 100 252 66 262 66 284 88 298 96V119H0Z"
      />
      <text x="150" y="43" textAnchor="middle">
        plate gone, then pits
      </text>
    </svg>
  );
}
