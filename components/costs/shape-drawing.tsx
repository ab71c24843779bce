import type { ReactNode } from "react";
import type { SimpleShape } from "@/lib/costs/part-area";

interface Drawing {
  /** Faces that are plated, filled. */
  faces: string;
  /** Edges that lie behind. */
  hidden?: string;
  /** Lines that show what a letter measures. */
  measures: string;
  letters: readonly (readonly [letter: string, x: number, y: number])[];
}

const DRAWINGS: Record<SimpleShape, Drawing> = {
  plate: {
    faces: "M30 62L64 26H138L104 62ZM30 62V67H104L138 31V26L104 62Z",
    measures: "M30 78H104M114 74L146 40",
    letters: [["l", 67, 93], ["w", 139, 66]],
  },
  rod: {
    faces: "M34 34H122A10 18 0 0 1 122 70H34A10 18 0 0 1 34 34ZM122 34A10 18 0 0 1 122 70A10 18 0 0 1 122 34Z",
    measures: "M34 82H122M146 34V70",
    letters: [["l", 78, 97], ["d", 156, 56]],
  },
  tube: {
    faces: "M34 34H122A10 18 0 0 1 122 70H34A10 18 0 0 1 34 34ZM122 34A10 18 0 0 1 122 70A10 18 0 0 1 122 34ZM122 42A6 10 0 0 1 122 62A6 10 0 0 1 122 42Z",
    hidden: "M34 42H116M34 62H116",
    measures: "M34 82H122M146 34V70M136 42V62",
    letters: [["l", 78, 97], ["d", 156, 56], ["i", 139, 28]],
  },
  box: {
    faces: "M30 44L52 26H132L110 44ZM110 44L132 26V62L110 80ZM30 44H110V80H30Z",
    measures: "M30 90H110M142 26V62M118 88L140 70",
    letters: [["l", 70, 105], ["h", 152, 48], ["w", 139, 90]],
  },
  disc: {
    faces: "M84 30A44 22 0 0 1 84 74A44 22 0 0 1 84 30Z",
    hidden: "M40 52V56A44 22 0 0 0 128 56V52",
    measures: "M40 90H128",
    letters: [["d", 84, 105]],
  },
  sphere: {
    faces: "M84 16A34 34 0 0 1 84 84A34 34 0 0 1 84 16Z",
    hidden: "M50 50A34 11 0 0 0 118 50",
    measures: "M50 94H118",
    letters: [["d", 84, 109]],
  },
}; // prettier-ignore

/** A simple shape with the letters of its formula. */
export function ShapeDrawing({ shape, label }: { shape: SimpleShape; label: string }): ReactNode {
  const { faces, hidden, measures, letters } = DRAWINGS[shape];
  return (
    <svg className="shape-drawing" viewBox="0 0 168 114" role="img" aria-label={label}>
      <path className="shape-drawing__faces" d={faces} />
      {hidden && <path className="shape-drawing__hidden" d={hidden} />}
      <path className="shape-drawing__measures" d={measures} />
      {letters.map(([letter, x, y]) => (
        <text key={letter} x={x} y={y} textAnchor="middle">
          {letter}
        </text>
      ))}
    </svg>
  );
}
