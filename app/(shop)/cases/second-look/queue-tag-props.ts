import { tagPhoto } from "@/components/cases/tag-photo";
import type { CasePhoto } from "@/db/queries/photos";
import type { SignedIn } from "@/db/queries/crew";
import type { QueueRow } from "@/db/queries/second-look";
import { formatMoney } from "@/lib/money";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";

/** What a waiting case's tag shows to this member: money only where they may see it, the photo once it is ready. */
export function queueTagProps(
  member: SignedIn,
  row: QueueRow,
  photo: CasePhoto | undefined,
  query: Record<string, string>,
) {
  return {
    row,
    href: routes.secondLook(row.ref, query),
    stake: can(member, "money.case") ? formatMoney(row.atRiskCents, member.shop.currency, { whole: true }) : undefined,
    photo: tagPhoto(photo),
  };
}
