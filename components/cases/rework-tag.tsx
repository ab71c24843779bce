import { Tag, type TagPhoto } from "@/components/cases/tag";
import { BASE_METAL_TITLES, type BaseMetal } from "@/lib/cases/case-words";
import { progressWords } from "@/lib/cases/card-progress";
import { counted } from "@/lib/cases/part-words";
import { routes } from "@/lib/routes";

export interface ReworkTagProps {
  card: {
    ref: string;
    state: "confirmed" | "in-rework";
    round: number;
    classSlug: string | null;
    classTitle: string | null;
    cardTitle: string;
    quantity: number;
    partName: string;
    baseMetal: BaseMetal;
    steps: number;
    ticked: number;
  };
  photo?: TagPhoto;
}

/** A card on the wire of the rework list: how far it has come, and what it is for. */
export function ReworkTag({ card, photo }: ReworkTagProps) {
  const parts = `${counted(card.quantity, "part")}, ${card.partName}, ${BASE_METAL_TITLES[card.baseMetal].toLowerCase()}`;
  return (
    <Tag
      caseRef={card.ref}
      href={routes.rework(card.ref)}
      state={card.state}
      stateWords={`${progressWords(card)}${card.round > 1 ? `, round ${card.round}` : ""}`}
      classSlug={card.classSlug}
      classWords={card.classTitle ?? card.cardTitle}
      meta={`${parts}. ${card.cardTitle}`}
      progress={card.steps === 0 ? 0 : card.ticked / card.steps}
      photo={photo}
    />
  );
}
