import { z } from "zod";
import type { Db, Handle } from "@/db/open";
import { listHeldBetween } from "@/db/queries/case-mails";
import { listCrew, type CrewMember } from "@/db/queries/crew";
import { listRefusersOf } from "@/db/queries/mail-choices";
import { lastMailAt } from "@/db/queries/outbox";
import { getShopName } from "@/db/queries/shops";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { secondLookMail } from "@/lib/crew/mails";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { enqueueDigest } from "./announce-held";
import { wholeLink } from "./links";
import { queueMail } from "./queue-mail";

const KIND = "second-look-waits";
const payloadShape = z.object({ shopId: z.number().int() });

/**
 * Mails each person who may confirm, and has not turned this off, the parts that were put on hold since their last such
 * message and still are. Nobody gets two within ten minutes: who got one lately gets the next when the ten are over.
 */
export function secondLookDigestJob(db: Db, payload: Record<string, string | number>, now: number): void {
  const { shopId } = payloadShape.parse(payload);
  db.transaction(
    (tx) => {
      const waits = readers(tx, shopId).flatMap((member) => mailOne(tx, shopId, member, now) ?? []);
      if (waits.length > 0) enqueueDigest(tx, shopId, now, Math.min(...waits));
    },
    { behavior: "immediate" },
  );
}

/** @returns when this person may be mailed, if parts wait for them but that is too early now */
function mailOne(tx: Handle, shopId: number, member: CrewMember, now: number): number | null {
  const lastAt = lastMailAt(tx, shopId, KIND, member.email);
  const held = listHeldBetween(tx, shopId, lastAt ?? 0, now);
  if (held.length === 0) return null;
  if (lastAt !== null && now - lastAt < CREW_LIMITS.digestMs) return lastAt + CREW_LIMITS.digestMs;
  const mail = secondLookMail({
    name: member.name,
    shopName: getShopName(tx, shopId),
    cases: held.map((each) => ({ ...each, link: wholeLink(routes.secondLook(each.ref)) })),
    queueLink: wholeLink(routes.queue()),
  });
  queueMail(tx, { shopId, kind: KIND, toEmail: member.email, ...mail, now });
  return null;
}

function readers(tx: Handle, shopId: number): CrewMember[] {
  const refusers = listRefusersOf(tx, shopId, KIND);
  return listCrew(tx, shopId).filter(
    (member) => can({ ...member, shopId }, "case.confirm") && !refusers.includes(member.memberId),
  );
}
