import Link from "next/link";
import type { CSSProperties } from "react";
import { stationGlyph } from "@/components/cases/class-glyph";
import { SourceMarks } from "@/components/library/source-marks";
import { Glyph } from "@/components/ui/glyph";
import { BASE_METAL_TITLES, type BaseMetal, type StationKind } from "@/lib/cases/case-words";
import { entryAnchor } from "@/lib/library/hit-href";
import type { ShareHere } from "@/lib/library/shop-share";
import type { CitedSource } from "@/lib/library/source-number";
import type { NotEnough } from "@/lib/input-error";

export interface CauseView {
  slug: string;
  title: string;
  station: StationKind;
  stationName: string;
  why: string;
  proof: string;
  /** The shelf's share, 0 to 1. */
  likelihood: number;
  here: ShareHere | NotEnough;
  /** The shop's cases of the class with this cause; null while there is none. */
  casesHref?: string | null;
  baseMetals: readonly BaseMetal[];
  sourceKeys: readonly string[];
  /** Titles of the fixes on this page, each with its anchor. */
  fixes: readonly { slug: string; title: string }[];
}

const percent = (share: number) => `${Math.round(share * 100)}%`;

type BarPlace = CSSProperties & Record<"--share" | "--low" | "--high" | "--shelf", string>;

/** The cause's share here as a bar with its range, and where the shelf puts it. */
function ShareDrawing({ here, likelihood }: { here: ShareHere; likelihood: number }) {
  const place: BarPlace = {
    "--share": percent(here.share),
    "--low": percent(here.low),
    "--high": percent(here.high),
    "--shelf": percent(likelihood),
  };
  return (
    <span className="cause__bar" style={place} aria-hidden="true">
      <i />
      <u />
      <em />
    </span>
  );
}

/** How likely a cause is: here, where the shop has cases enough, and on the shelf. */
function CauseShare({ cause }: { cause: CauseView }) {
  const { here, likelihood } = cause;
  return (
    <div className="cause__share">
      {here.enough ? (
        <>
          <ShareDrawing here={here} likelihood={likelihood} />
          <p>
            <span className="fig cause__figure">{percent(here.share)}</span> here, {here.cases} of {here.of} cases;{" "}
            <span aria-hidden="true">
              {percent(here.low)} to {percent(here.high)}
            </span>
            <span className="sr-only">
              , 95% range {percent(here.low)} to {percent(here.high)}
            </span>
          </p>
        </>
      ) : (
        <p>
          Not enough cases yet: {here.have} of {here.need}
        </p>
      )}
      <p className="quiet">{percent(likelihood)} on the shelf</p>
      {cause.casesHref && (
        <Link className="solo" href={cause.casesHref} prefetch={false}>
          Open its cases<span className="sr-only">: {cause.title}</span>
        </Link>
      )}
    </div>
  );
}

interface CauseRowProps {
  cause: CauseView;
  sources: readonly CitedSource[];
  /** For those who may edit it. */
  editHref?: string;
}

/** A cause: where it arises, how likely it is, why it happens, and the check that proves it. */
export function CauseRow({ cause, sources, editHref }: CauseRowProps) {
  return (
    <article className="cause" id={entryAnchor("cause", cause.slug)}>
      <Glyph name={stationGlyph(cause.station)} />
      <div className="cause__head">
        <h3>{cause.title}</h3>
        <p className="quiet">{cause.stationName}</p>
      </div>
      <CauseShare cause={cause} />
      <div className="cause__words">
        <p>{cause.why}</p>
        <p>
          <strong>Proof:</strong> {cause.proof}
        </p>
        <p>
          <strong>Base metals at risk:</strong>{" "}
          {cause.baseMetals.map((metal) => BASE_METAL_TITLES[metal].toLowerCase()).join(", ")}
        </p>
        {cause.fixes.length > 0 && (
          <p className="cause__fixes">
            <strong>Fixes:</strong>
            {cause.fixes.map((fix) => (
              <a key={fix.slug} href={`#${entryAnchor("fix", fix.slug)}`}>
                {fix.title}
              </a>
            ))}
          </p>
        )}
        <SourceMarks keys={cause.sourceKeys} sources={sources} />
        {editHref && (
          <Link className="solo no-print" href={editHref} aria-label={`Edit the cause “${cause.title}”`}>
            Edit
          </Link>
        )}
      </div>
    </article>
  );
}
