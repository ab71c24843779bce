import type { CSSProperties } from "react";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";

export interface SplitLine {
  /** Null: "can't tell". */
  slug: string | null;
  title: string;
  atTheTank: number;
  inPractice: number;
  isConfirmed: boolean;
}

const whereWords = ({ atTheTank, inPractice }: SplitLine) =>
  [atTheTank > 0 && `${atTheTank} at the tank`, inPractice > 0 && `${inPractice} in practice`]
    .filter(Boolean)
    .join(", ");

/** How the shop split over this part: a line a class, with who said it where. */
export function ShopSplit({ lines }: { lines: readonly SplitLine[] }) {
  const all = lines.reduce((sum, line) => sum + line.atTheTank + line.inPractice, 0);
  return (
    <ul className="shop-split">
      {lines.map((line) => {
        const share = all > 0 ? ((line.atTheTank + line.inPractice) / all) * 100 : 0;
        return (
          <li key={line.slug ?? "cant-tell"}>
            <Glyph name={classGlyph(line.slug)} size={26} />
            <span className="shop-split__class">
              {line.title}
              {line.isConfirmed && <em>confirmed</em>}
            </span>
            <span className="small mid">{whereWords(line)}</span>
            <i className="share-bar" style={{ "--v": share } as CSSProperties} aria-hidden="true" />
          </li>
        );
      })}
    </ul>
  );
}
