import type { Metadata } from "next";
import { DrillForm } from "@/components/practice/drill-form";
import { SetDrill } from "@/components/practice/set-drill";
import { ShopShell } from "@/components/shell/shop-shell";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { counted } from "@/lib/cases/part-words";
import { dayOf } from "@/lib/costs/period";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { setDrill, withdrawDrill } from "../actions";
import { loadDrills } from "./load-drills";

export const metadata: Metadata = { title: "Practice · Drills" };

const FORM = "set-drill";

/** Where seniors set drills and see what came of them. */
export default async function DrillsPage() {
  const member = await guardPage("drill.set", routes.practiceDrills());
  const now = Date.now();
  const { classes, people, drills } = loadDrills(getDb(), member, now);
  const { actor, counts } = shellFor(member);
  const running = drills.filter((drill) => !drill.isWithdrawn).length;
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="practice"
      back={routes.practice()}
      main={{ label: "Set the drill", form: FORM }}
      className="practice"
    >
      <Lead size="page" below="Confirmed photos of the classes you choose, one a case, none twice.">
        {running === 0 ? "No drill is set" : `${counted(running, "drill")} set`}
      </Lead>
      <div className="cols--main">
        <Section title="Set drills">
          {drills.length === 0 ? (
            <Empty title="None yet.">A drill stands first on the practice page of whom it is for.</Empty>
          ) : (
            drills.map((drill) => <SetDrill key={drill.id} {...drill} onWithdraw={withdrawDrill} />)
          )}
        </Section>
        <div>
          <Section title="Set a drill" id="set">
            <DrillForm
              id={FORM}
              classes={classes}
              people={people}
              today={dayOf(now, member.shop.timeZone)}
              onSet={setDrill}
            />
          </Section>
        </div>
      </div>
    </ShopShell>
  );
}
