import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listDrillsFor } from "@/db/queries/practice-drills";
import { listDrillAnswers } from "@/db/queries/practice-questions";
import { SITTING } from "@/lib/practice/practice-words";
import { waitingPhotos } from "@/lib/server/practice/choose-photo";

/** How much practice waits for a person: photos that are due, new ones for a sitting, drills not done. */
export function countPractice(member: SignedIn, now: number) {
  const db = getDb();
  const { due, fresh } = waitingPhotos({ db, member, now });
  const drills = listDrillsFor(db, member.shopId, member.memberId).filter(
    (drill) => listDrillAnswers(db, member.shopId, member.memberId, drill.id).length < drill.photoCount,
  );
  return { due: due.length, fresh: Math.min(SITTING, fresh.length), drills: drills.length };
}
