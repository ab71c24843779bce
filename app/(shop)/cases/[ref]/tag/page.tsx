import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { PrintButton } from "@/components/cases/print-button";
import { QrCode } from "@/components/cases/qr-code";
import { TagPrint } from "@/components/cases/tag-print";
import { ShopShell } from "@/components/shell/shop-shell";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { LinkButton } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { getDb } from "@/db/client";
import { getHoldTag } from "@/db/queries/hold-tag";
import { STAGE_TITLES } from "@/lib/cases/case-words";
import { callWords, metalWords, partsOf } from "@/lib/cases/part-words";
import { qrCode } from "@/lib/cases/qr-code";
import { dayAndTime } from "@/lib/cases/shop-clock";
import { shortName } from "@/lib/crew/initials";
import { readEnv } from "@/lib/env";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

interface TagPageProps {
  params: Promise<{ ref: string }>;
}

export async function generateMetadata({ params }: TagPageProps): Promise<Metadata> {
  return { title: `Hold tag ${(await params).ref}` };
}

/** The hold tag to print: A6, upright, with the code that opens its case. */
export default async function TagPage({ params }: TagPageProps) {
  const { ref } = await params;
  const member = await guardPage("case.see", routes.tag(ref));
  const tag = getHoldTag(getDb(), member.shopId, ref);
  if (!tag) notFound();
  const { actor, counts } = shellFor(member);
  const code = qrCode(new URL(routes.case(tag.ref), readEnv().NEXTAUTH_URL).href);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      thumb={
        <ThumbBar back={routes.case(ref)}>
          <PrintButton>Print the tag</PrintButton>
        </ThumbBar>
      }
    >
      <div className="tag-page">
        <div className="no-print tag-page__words">
          <h1>Hold tag {tag.ref}</h1>
          {tag.state === "closed" ? (
            <Note tone="amber" title="This case is closed">
              Its part is off hold. Print the tag for the record only.
            </Note>
          ) : (
            <p>Print it on A6, or on A4 and cut along the edge. Wire it to the rack through the hole.</p>
          )}
          <div className="btns desk-only">
            <PrintButton>Print the tag</PrintButton>
            <LinkButton href={routes.case(ref)}>Back to the case</LinkButton>
          </div>
        </div>
        <TagPrint
          shopName={member.shop.name}
          caseRef={tag.ref}
          classWords={`Do not plate. ${callWords(tag.classTitle, tag.state !== "held")}`}
          lines={linesOf(tag, member.shop.timeZone)}
          // The tag is white for more than four modules round it, so the code itself gets the whole 30 mm.
          qr={<QrCode path={code.path} viewBox={`0 0 ${code.size} ${code.size}`} label={`QR code of ${tag.ref}`} />}
        />
      </div>
    </ShopShell>
  );
}

function linesOf(tag: NonNullable<ReturnType<typeof getHoldTag>>, timeZone: string) {
  return [
    { label: "Job", value: `${tag.jobNumber} ${tag.customer}` },
    { label: "Parts", value: `${partsOf(tag.quantity, tag.partsStruck)}, ${tag.partName}` },
    { label: "Base metal", value: metalWords(tag.baseMetal, tag.alloy) },
    ...(tag.runCode ? [{ label: "Run", value: tag.runCode }] : []),
    ...(tag.round > 1 ? [{ label: "Round", value: String(tag.round) }] : []),
    { label: "Found", value: STAGE_TITLES[tag.stageFound] },
    { label: "Held by", value: `${shortName(tag.openedBy)}, ${dayAndTime(tag.openedAt, timeZone)}` },
  ];
}
