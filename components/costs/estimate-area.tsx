"use client";

import { ShapeDrawing } from "@/components/costs/shape-drawing";
import type { StripEditing } from "@/components/costs/estimate-editing";
import { Field, SelectField } from "@/components/ui/field";
import { PickGroup } from "@/components/ui/pick";
import {
  AREA_FORMULAS,
  AREA_SHAPE_TITLES,
  AREA_SHAPES,
  LENGTHS_OF,
  SHAPE_LENGTH_TITLES,
  type SimpleShape,
} from "@/lib/costs/part-area";
import { withAreaUnit, withLengthUnit } from "@/lib/costs/strip-typing";
import { figureWords } from "@/lib/costs/strip-words";
import { dm2ToSquareInch } from "@/lib/units";

const SHAPE_OPTIONS = AREA_SHAPES.map((shape) => ({ value: shape, label: AREA_SHAPE_TITLES[shape] }));
const SHAPES = new Map<string, SimpleShape>(
  AREA_SHAPES.flatMap((shape) => (shape === "typed" ? [] : [[shape, shape] as const])),
);

/** The area of one part: typed, or from a simple shape with its formula. */
export function StripArea(editing: StripEditing) {
  const { typed, faults, onChange } = editing;
  const shape = SHAPES.get(typed.shape);
  return (
    <div className="est-area">
      <SelectField
        label="Area of one part"
        name="shape"
        options={SHAPE_OPTIONS}
        placeholder={faults.shape ? "Choose" : undefined}
        value={faults.shape ? "" : typed.shape}
        onChange={(event) => onChange({ ...typed, shape: event.target.value })}
        error={faults.shape}
      />
      {shape ? <ShapeLengths {...editing} shape={shape} /> : <TypedArea {...editing} />}
    </div>
  );
}

function TypedArea({ typed, faults, onChange }: StripEditing) {
  return (
    <div className="est-area__typed">
      <Field
        label="Area, each"
        name="area"
        unit={typed.areaUnit === "in2" ? "in²" : "dm²"}
        inputMode="decimal"
        maxLength={14}
        value={typed.area}
        onChange={(event) => onChange({ ...typed, area: event.target.value })}
        error={faults.area}
      />
      <PickGroup
        legend="Area in"
        hideLegend
        name="areaUnit"
        kind="radio"
        layout="bar"
        options={[
          { value: "dm2", label: "dm²" },
          { value: "in2", label: "in²" },
        ]}
        value={typed.areaUnit === "in2" ? "in2" : "dm2"}
        onChange={(event) => onChange(withAreaUnit(typed, event.target.value))}
      />
    </div>
  );
}

function ShapeLengths({ typed, faults, onChange, reading, shape }: StripEditing & { shape: SimpleShape }) {
  const unit = typed.lengthUnit === "in" ? "in" : "cm";
  return (
    <div className="est-shape">
      <figure className="est-shape__figure">
        <ShapeDrawing shape={shape} label={AREA_SHAPE_TITLES[shape]} />
        <figcaption>
          <span className="mono">{AREA_FORMULAS[shape]}</span>
          {reading.batch && (
            <strong className="fig">
              {figureWords(reading.batch.areaDm2)} dm², {figureWords(dm2ToSquareInch(reading.batch.areaDm2))} in²
            </strong>
          )}
        </figcaption>
      </figure>
      <div className="est-shape__fields">
        {LENGTHS_OF[shape].map((name) => (
          <Field
            key={name}
            label={SHAPE_LENGTH_TITLES[name]}
            name={name}
            unit={unit}
            inputMode="decimal"
            maxLength={14}
            value={typed[name]}
            onChange={(event) => onChange({ ...typed, [name]: event.target.value })}
            error={faults[name]}
          />
        ))}
        <PickGroup
          legend="Lengths in"
          hideLegend
          name="lengthUnit"
          kind="radio"
          layout="bar"
          options={[
            { value: "cm", label: "cm" },
            { value: "in", label: "inch" },
          ]}
          value={typed.lengthUnit === "in" ? "in" : "cm"}
          onChange={(event) => onChange(withLengthUnit(typed, event.target.value))}
        />
      </div>
      {faults.area && <p className="field__error">{faults.area}</p>}
    </div>
  );
}
