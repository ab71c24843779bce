"use client";

import { useId } from "react";
import { CrossSection, SectionLeaders } from "@/components/costs/cross-section";
import { LayerRow } from "@/components/costs/estimate-layer-row";
import type { StripEditing } from "@/components/costs/estimate-editing";
import { Button } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import { PickGroup } from "@/components/ui/pick";
import { Section } from "@/components/ui/section";
import { BASE_METAL_TITLES, BASE_METALS } from "@/lib/cases/case-words";
import { sectionScale } from "@/lib/costs/section-scale";
import { changeStack, withThicknessUnit } from "@/lib/costs/strip-typing";
import { STACK_LIMITS, type WeighedLayer } from "@/lib/plating/deposit-stack";

interface StripLayersProps extends StripEditing {
  /** Weights of the last stack that could be reckoned. */
  weighed: readonly WeighedLayer[] | null;
}

/** What is on the part: the deposit cut through, and a row for each layer to change it by. */
export function StripLayers({ weighed, ...editing }: StripLayersProps) {
  const { typed, faults, reading, onChange } = editing;
  const { section } = reading;
  const scale = section && sectionScale(section.stack.map((layer) => layer.thicknessUm));
  const isInStep = reading.batch !== null && weighed?.length === typed.layers.length;
  const isAllToScale = scale?.bands.every((band) => band.isToScale) ?? true;
  return (
    <Section
      title="What is on the part"
      aside={isAllToScale ? "Layers to scale, base cut short" : "To scale but where it says so, base cut short"}
      className="est-stack"
    >
      <div className="est-cut">
        <div className="est-cut__drawing">
          {section && scale ? (
            <CrossSection layers={section.stack} scale={scale} baseMetal={section.baseMetal} />
          ) : (
            <p className="est-cut__waits">Drawn once each layer has its metal and thickness</p>
          )}
        </div>
        <div className="est-cut__leaders">{scale && <SectionLeaders scale={scale} />}</div>
        <ol className="est-cut__rows" reversed start={typed.layers.length}>
          {typed.layers
            .map((layer, index) => (
              <LayerRow
                key={index}
                {...editing}
                layer={layer}
                place={index + 1}
                weighed={isInStep ? weighed[index] : undefined}
                isToScale={scale?.bands[index]?.isToScale ?? true}
              />
            ))
            .toReversed()}
          <BaseRow {...editing} />
        </ol>
      </div>
      {faults.stack && <FaultLine words={faults.stack} />}
      <StackButtons typed={typed} onChange={onChange} />
    </Section>
  );
}

function BaseRow({ typed, faults, onChange }: StripEditing) {
  const errorId = useId();
  const isKnown = BASE_METALS.some((metal) => metal === typed.base);
  return (
    <li className="est-layer est-layer--base">
      <div className="est-layer__fields">
        <span className="est-layer__metal">
          <select
            className="input"
            name="base"
            aria-label="Base metal"
            aria-invalid={faults.base ? true : undefined}
            aria-describedby={faults.base ? errorId : undefined}
            value={typed.base}
            onChange={(event) => onChange({ ...typed, base: event.target.value })}
          >
            {!isKnown && <option value={typed.base}>{typed.base === "" ? "Choose" : typed.base}</option>}
            {BASE_METALS.map((metal) => (
              <option key={metal} value={metal}>
                {BASE_METAL_TITLES[metal]}
              </option>
            ))}
          </select>
        </span>
        <input
          className="input est-layer__alloy"
          name="alloy"
          aria-label="Alloy"
          placeholder="Alloy"
          maxLength={60}
          autoComplete="off"
          value={typed.alloy}
          onChange={(event) => onChange({ ...typed, alloy: event.target.value })}
        />
      </div>
      {faults.base && (
        <p className="field__error" id={errorId}>
          <Glyph name="ui-caution" size={20} />
          {faults.base}
        </p>
      )}
      <p className="est-layer__words">Base metal and alloy. Every way is checked against the metal.</p>
    </li>
  );
}

function StackButtons({ typed, onChange }: Pick<StripEditing, "typed" | "onChange">) {
  const press = (change: string) => ({
    type: "submit" as const,
    name: "do",
    value: change,
    onClick: (event: { preventDefault: () => void }) => {
      event.preventDefault();
      onChange(changeStack(typed, change));
    },
  });
  const isFull = typed.layers.length >= STACK_LIMITS.layers;
  return (
    <div className="est-stack__foot">
      <Button {...press("add")} glyph="ui-plus" disabledReason={isFull ? "12 layers are the most." : undefined}>
        Add a layer
      </Button>
      <Button {...press("off")} disabled={typed.layers.length <= 1}>
        Take the top one off
      </Button>
      <PickGroup
        legend="Thickness in"
        hideLegend
        name="thicknessUnit"
        kind="radio"
        layout="bar"
        options={[
          { value: "um", label: "µm" },
          { value: "mil", label: "mil" },
        ]}
        value={typed.thicknessUnit === "mil" ? "mil" : "um"}
        onChange={(event) => onChange(withThicknessUnit(typed, event.target.value))}
      />
    </div>
  );
}

function FaultLine({ words }: { words: string }) {
  return (
    <p className="field__error" role="alert">
      <Glyph name="ui-caution" size={20} />
      {words}
    </p>
  );
}
