import { Glyph } from "@/components/ui/glyph";
import { Slip } from "@/components/ui/slip";
import { WithdrawDrill } from "@/components/practice/withdraw-drill";
import type { FormAct } from "@/components/cases/use-send";
import { standingWords, type DrillStanding } from "@/lib/practice/drill";

export interface SetDrillProps {
  id: number;
  title: string;
  /** "10 photos of dewetting, peeling; by 24 Dec 2026; set by Ines Vargas, 1 Dec 2026". */
  words: string;
  isWithdrawn: boolean;
  people: readonly { memberId: number; name: string; standing: DrillStanding }[];
  onWithdraw: FormAct<{ id: number }>;
}

/** A drill as the senior sees it: what it asks, and how far each person is. */
export function SetDrill({ id, title, words, isWithdrawn, people, onWithdraw }: SetDrillProps) {
  return (
    <article className="set-drill">
      <h3>
        <Glyph name={isWithdrawn ? "ui-cross" : "station-inspect"} size={28} />
        {title}
        {isWithdrawn && <em>withdrawn</em>}
      </h3>
      <p className="small mid">{words}</p>
      <Slip rows={people.map((person) => ({ label: person.name, value: standingWords(person.standing) }))} />
      {!isWithdrawn && <WithdrawDrill drillId={id} title={title} onWithdraw={onWithdraw} />}
    </article>
  );
}
