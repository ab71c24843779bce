import type { ReactNode } from "react";

export interface TagPrintProps {
  shopName: string;
  caseRef: string;
  /** "HOLD" is printed large; this says why: "Underactivation?" */
  classWords: string;
  /** Job, parts, base metal, who, when. */
  lines: readonly { label: string; value: string }[];
  /** The QR code as svg or img; printed 30 mm wide. */
  qr: ReactNode;
}

/** The tag as it comes out of the printer: A6, upright, black on white. */
export function TagPrint({ shopName, caseRef, classWords, lines, qr }: TagPrintProps) {
  return (
    <article className="tag-print" aria-label={`Hold tag ${caseRef}`}>
      <span className="tag-print__hole" aria-hidden="true" />
      <p className="tag-print__hold">Hold</p>
      <p className="tag-print__ref ref">{caseRef}</p>
      <p className="tag-print__class">{classWords}</p>
      <dl className="slip">
        {lines.map((line) => (
          <div key={line.label}>
            <dt>{line.label}</dt>
            <dd>{line.value}</dd>
          </div>
        ))}
      </dl>
      <div className="tag-print__foot">
        <div className="tag-print__qr">{qr}</div>
        <p>
          {shopName}
          <br />
          Not to go on without a second look.
        </p>
      </div>
      <span className="tag-print__tail" aria-hidden="true" />
    </article>
  );
}
