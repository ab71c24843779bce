import "server-only";
import { and, eq } from "drizzle-orm";
import type { Db } from "@/db/open";
import { cases, exemplars, photos } from "@/db/schema";
import type { SignedIn } from "@/db/queries/crew";
import { fault } from "@/lib/fault";

/**
 * Makes a ready photo of a confirmed case an exemplar of its class, or takes that back.
 * @throws FaultError "not-found" when the photo is not on this case of this shop, "conflict" when no class is confirmed
 */
export function chooseExemplar(
  { db, member, now }: { db: Db; member: SignedIn; now: number },
  input: { ref: string; photoId: string; chosen: boolean },
): { ref: string } {
  const row = db
    .select({ classSlug: cases.confirmedClass })
    .from(photos)
    .innerJoin(cases, eq(cases.id, photos.caseId))
    .where(
      and(
        eq(photos.shopId, member.shopId),
        eq(photos.id, input.photoId),
        eq(photos.state, "ready"),
        eq(cases.shopId, member.shopId),
        eq(cases.ref, input.ref),
      ),
    )
    .get();
  if (!row) throw fault("not-found", "That photo is not on this case, or it is not ready yet.");
  if (!row.classSlug) throw fault("conflict", "A photo becomes an exemplar once the class is confirmed.");
  const key = { shopId: member.shopId, classSlug: row.classSlug, photoId: input.photoId };
  if (input.chosen) {
    db.insert(exemplars)
      .values({ ...key, chosenById: member.memberId, at: now })
      .onConflictDoNothing()
      .run();
  } else {
    db.delete(exemplars)
      .where(
        and(
          eq(exemplars.shopId, key.shopId),
          eq(exemplars.classSlug, key.classSlug),
          eq(exemplars.photoId, key.photoId),
        ),
      )
      .run();
  }
  return { ref: input.ref };
}
