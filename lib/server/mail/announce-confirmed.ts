import type { Handle } from "@/db/open";
import { getCaseForMail } from "@/db/queries/case-mails";
import { getCrewMember } from "@/db/queries/crew";
import { listMailRefusals } from "@/db/queries/mail-choices";
import { DISPOSITION_TITLES } from "@/lib/cases/case-words";
import { caseConfirmedMail } from "@/lib/crew/mails";
import { routes } from "@/lib/routes";
import { wholeLink } from "./links";
import { queueMail } from "./queue-mail";

const KIND = "case-confirmed";

interface Announcement {
  caseId: number;
  shopId: number;
  now: number;
}

/**
 * The second look is done (confirmed, or released as sound): the person who opened the case hears of it, unless they
 * took it themselves, have left the crew or turned this message off. Call it after the case row has changed.
 */
export function announceConfirmed(tx: Handle, { caseId, shopId, now }: Announcement): void {
  const found = getCaseForMail(tx, shopId, caseId);
  if (!found || found.openedById === found.confirmedById) return;
  const opener = getCrewMember(tx, shopId, found.openedById);
  if (!opener || listMailRefusals(tx, shopId, opener.memberId).includes(KIND)) return;
  const mail = caseConfirmedMail({
    name: opener.name,
    ref: found.ref,
    confirmedBy: found.confirmedBy ?? "A senior tech",
    classTitle: found.closing === "released" ? null : found.classTitle,
    dispositionTitle: found.disposition ? DISPOSITION_TITLES[found.disposition] : null,
    link: wholeLink(routes.case(found.ref)),
  });
  queueMail(tx, { shopId, kind: KIND, toEmail: opener.email, ...mail, now });
}
