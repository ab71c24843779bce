import { classGlyph } from "@/components/cases/class-glyph";
import { classWords } from "@/components/cases/class-words";
import { Glyph } from "@/components/ui/glyph";
import { SURENESS_TITLES, type Sureness } from "@/lib/cases/case-words";

export interface NamedClass {
  slug: string;
  title: string;
}

export interface VerdictProps {
  /** Null: "can't tell". */
  called: NamedClass | null;
  sure: Sureness;
  confirmed: NamedClass;
}

/** What was called beside what the second look confirmed. */
export function Verdict({ called, sure, confirmed }: VerdictProps) {
  return (
    <div className="verdict">
      <div>
        <p>You called{called && `, ${SURENESS_TITLES[sure].toLowerCase()}`}</p>
        <b>
          <Glyph name={classGlyph(called?.slug ?? null)} size={30} />
          {called ? classWords(called.title) : "Can't tell"}
        </b>
      </div>
      <div>
        <p>Second look</p>
        <b className="good">
          <Glyph name={classGlyph(confirmed.slug)} size={30} />
          {classWords(confirmed.title)}
        </b>
      </div>
    </div>
  );
}
