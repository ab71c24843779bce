import { Tag, type TagPhoto } from "@/components/cases/tag";
import type { BaseMetal } from "@/lib/cases/case-words";
import { metalInSentence } from "@/lib/cases/metal-words";
import { tagStanding } from "@/lib/cases/tag-standing";

export interface QueueTagCase {
  ref: string;
  round: number;
  heldAt: number;
  quantity: number;
  partName: string;
  baseMetal: BaseMetal;
  alloy: string | null;
  calledClass: string | null;
  confirmedClass: string | null;
  classTitle: string | null;
}

interface QueueTagProps {
  row: QueueTagCase;
  href: string;
  now: number;
  /** Money at risk in words; left out for those who may not see it. */
  stake?: string;
  photo?: TagPhoto;
  current?: boolean;
}

/** What the tag says of the class: a call is a question; after a failed round stands what it was taken for. */
function classOf(row: QueueTagCase): string {
  if (row.classTitle === null) return "Can't tell yet";
  return row.calledClass === null ? `Was ${row.classTitle.toLowerCase()}` : `${row.classTitle}?`;
}

/** One waiting case on the queue's wire. */
export function QueueTag({ row, href, now, stake, photo, current }: QueueTagProps) {
  const standing = tagStanding({ ...row, state: "held", closing: null }, now);
  return (
    <Tag
      caseRef={row.ref}
      href={href}
      state={standing.state}
      stateWords={standing.words}
      classSlug={row.calledClass ?? row.confirmedClass}
      classWords={classOf(row)}
      meta={`${row.quantity} × ${row.partName}, ${metalInSentence(row.baseMetal, row.alloy)}`}
      stake={stake}
      photo={photo}
      current={current}
    />
  );
}
