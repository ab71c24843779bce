import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { FocusHeading } from "@/components/cases/focus-heading";
import { ReworkCard } from "@/components/cases/rework-card";
import { ReworkDispose } from "@/components/cases/rework-dispose";
import { LineStrip } from "@/components/line/line-strip";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { getDb } from "@/db/client";
import { getHoldTag } from "@/db/queries/hold-tag";
import { listCasePhotos } from "@/db/queries/photos";
import { getReworkCard } from "@/db/queries/rework";
import { cardProgress, progressWords } from "@/lib/cases/card-progress";
import { canHappen } from "@/lib/cases/case-state";
import { counted } from "@/lib/cases/part-words";
import { dayAndTime } from "@/lib/cases/shop-clock";
import { writeStep } from "@/lib/cases/written-step";
import { shortName } from "@/lib/crew/initials";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { disposeCase } from "../../actions";
import { DoneView } from "./done-view";
import { OutcomeView } from "./outcome-view";
import { StepView } from "./step-view";

interface CardPageProps {
  params: Promise<{ ref: string }>;
  searchParams: Promise<{ step?: string }>;
}

export async function generateMetadata({ params }: CardPageProps): Promise<Metadata> {
  return { title: `Rework ${(await params).ref}` };
}

/** A case's rework card: the open step, the outcome once all are ticked, or what became of it. */
export default async function CardPage({ params, searchParams }: CardPageProps) {
  const { ref } = await params;
  const asked = Number((await searchParams).step);
  const member = await guardPage("case.see", routes.rework(ref));
  const db = getDb();
  const card = getReworkCard(db, member.shopId, ref);
  if (!card && !getHoldTag(db, member.shopId, ref)) notFound();
  const { actor, counts, stations } = shellFor(member);
  const shell = {
    actor,
    counts,
    here: "rework" as const,
    className: "rw-page",
    // A phone in a wet glove keeps only the step, as on the snap: the strip is for wider screens.
    strip: (
      <div className="rw-strip">
        <LineStrip
          mode="thin"
          stations={stations}
          pressed={null}
          hrefFor={(station) => routes.reworkList(station ? { station } : undefined)}
        />
      </div>
    ),
  };
  if (!card) {
    return (
      <ShopShell {...shell} back={routes.case(ref)}>
        <h1>Rework of {ref}</h1>
        <Empty title="No card yet" level={2}>
          A senior tech sends one with the second look.
        </Empty>
      </ShopShell>
    );
  }

  const photos = listCasePhotos(db, member.shopId, card.caseId);
  const isOpen = card.round === card.caseRound && canHappen(card.state, "disposed");
  if (!isOpen) {
    return (
      <ShopShell {...shell} back={routes.reworkList()}>
        <FocusHeading on={`done ${card.round}`} />
        <DoneView card={card} photos={photos} member={member} />
      </ShopShell>
    );
  }

  const progress = cardProgress(card.steps);
  const shown = Number.isInteger(asked) && asked >= 1 && asked <= progress.steps ? asked : progress.openStep;
  const canWork = can(member, "card.work");
  const view = { card, member, canWork, photos, shown, openStep: progress.openStep };
  return (
    // While the card is worked its form brings the thumb bar; who only reads gets the way back.
    <ShopShell {...shell} back={routes.reworkList()} thumb={canWork && shown === progress.openStep ? <></> : undefined}>
      <FocusHeading on={`round ${card.round} step ${shown ?? "all"}`} />
      <ReworkCard
        caseRef={ref}
        caseHref={routes.case(ref)}
        parts={`${counted(card.quantity, "part")}, ${card.partName}`}
        state={card.state === "confirmed" ? "confirmed" : "in-rework"}
        stateWords={`${progressWords(progress)}${card.round > 1 ? `, round ${card.round}` : ""}`}
        steps={card.steps.map((step) => writeStep(step, member.shop.timeZone))}
        shown={shown}
        stepHref={(step) => routes.reworkStep(ref, step)}
        cardTitle={card.cardTitle}
        sent={`Sent by ${shortName(card.madeBy)}, ${dayAndTime(card.madeAt, member.shop.timeZone)}`}
        minutes={`${progress.spentMinutes} of ${progress.plannedMinutes} min`}
        foot={can(member, "case.confirm") && <ReworkDispose caseRef={ref} onDispose={disposeCase} />}
      >
        {shown === null ? <OutcomeView {...view} /> : <StepView {...view} shown={shown} />}
      </ReworkCard>
    </ShopShell>
  );
}
