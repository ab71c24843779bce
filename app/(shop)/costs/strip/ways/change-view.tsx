import Link from "next/link";
import { StripTurnForm } from "@/components/costs/strip-turn-form";
import { StripWayForm } from "@/components/costs/strip-way-form";
import { StripWayHistory, type StripRowStory } from "@/components/costs/strip-way-history";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import type { SignedIn } from "@/db/queries/crew";
import type { StripHistoryRow } from "@/db/queries/strip-table";
import { dayWords, momentWords } from "@/lib/cases/moment-words";
import { stripRowChanges } from "@/lib/costs/strip-row-changes";
import { isFromMemory } from "@/lib/costs/strip-row-fields";
import { metalOf } from "@/lib/plating/metals";
import { routes } from "@/lib/routes";
import { shellFor } from "@/lib/server/shell-data";
import { changeBath, changePolishing, turnWay } from "./actions";
import { bathFields, polishFields, wayMeta, wayTitle } from "./way-view";

const FORM_ID = "way";

interface ChangeViewProps {
  member: SignedIn;
  standing: StripHistoryRow;
  /** Its rows, the newest first. */
  rows: readonly StripHistoryRow[];
}

/** One way to strip: its figures to change while it is offered, the way back once it is retired, and every row it had. */
export function ChangeView({ member, standing, rows }: ChangeViewProps) {
  const { row, slug, id, retired } = standing;
  const { actor, counts } = shellFor(member);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="strip"
      back={routes.stripWays()}
      main={{ label: retired ? "Bring it back" : "Save this way", form: FORM_ID }}
    >
      <p className="lib-crumb">
        <Link href={routes.stripWays()}>Ways to strip</Link>
      </p>
      <Lead size="page" below={`${wayMeta(row)}.${takesOffWords(row)}`}>
        {retired ? `Retired: ${wayTitle(row)}` : wayTitle(row)}
      </Lead>
      <div className="cols--main">
        <Section title={retired ? "Bring it back" : "What the shop knows of it"}>
          {retired ? (
            <StripTurnForm id={FORM_ID} slug={slug} startedFrom={id} isRetired action={turnWay} />
          ) : (
            <>
              {row.method !== "polish-back" && isFromMemory(row.rateSource) && (
                <Note tone="amber" title="The rate is from memory">
                  Time a panel or two in the shop’s own bath, and set what you measured.
                </Note>
              )}
              <StripWayForm
                id={FORM_ID}
                slug={slug}
                startedFrom={id}
                bath={row.method === "polish-back" ? null : bathFields(row, member.shop.currency)}
                polishing={row.method === "polish-back" ? polishFields(row) : null}
                action={row.method === "polish-back" ? changePolishing : changeBath}
              />
            </>
          )}
        </Section>
        <div>
          <Section title="Its rows" aside="The newest first">
            <StripWayHistory rows={storiesOf(member, rows)} />
          </Section>
          {!retired && row.method !== "polish-back" && (
            <Section title="Retire it">
              <StripTurnForm slug={slug} startedFrom={id} isRetired={false} action={turnWay} />
            </Section>
          )}
        </div>
      </div>
    </ShopShell>
  );
}

function takesOffWords(row: StripHistoryRow["row"]): string {
  if (row.method === "polish-back") return "";
  const names = row.takesOff.map((metal) => metalOf(metal).name);
  return ` Takes off ${names.length > 1 ? `${names.slice(0, -1).join(", ")} and ${names.at(-1)}` : names[0]}. Another solution is another way: add it.`;
}

function storiesOf(member: SignedIn, rows: readonly StripHistoryRow[]): StripRowStory[] {
  const { timeZone, currency } = member.shop;
  return rows.map((row, index) => {
    const before = rows[index + 1];
    const isTurned = before !== undefined && before.retired !== row.retired;
    return {
      id: row.id,
      at: row.setByName ? momentWords(row.setAt, timeZone, Date.now()) : dayWords(row.setAt, timeZone),
      changes: before ? stripRowChanges(before.row, row.row, currency) : null,
      turned: isTurned ? (row.retired ? "Retired it." : "Brought it back.") : null,
      setBy: row.setByName ?? "Came with the shop",
    };
  });
}
