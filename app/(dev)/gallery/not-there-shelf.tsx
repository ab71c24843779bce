import { BusBar } from "@/components/shell/offline-bar";
import { Broken } from "@/components/ui/broken";
import { LinkButton } from "@/components/ui/button";
import { Caution } from "@/components/ui/caution";
import { Empty } from "@/components/ui/empty";
import { Note } from "@/components/ui/note";
import { ReadingTank } from "@/components/ui/reading-tank";
import { Refused } from "@/components/ui/refused";
import { Section } from "@/components/ui/section";
import { TooFew } from "@/components/ui/too-few";

/** Notes, and what stands in the place of what is not there. */
export function NotThereShelf() {
  return (
    <Section title="When things are not there">
      <div className="cols">
        <div className="stack">
          <div>
            <BusBar open words="No signal. 2 tags and 5 photos are safe on this phone. They go up by themselves." />
          </div>
          <ReadingTank title="Reading photo 1">You can call it before this is done.</ReadingTank>
          <TooFew have={3} need={8}>
            A rate shows here at 8 closed cases.
          </TooFew>
          <Empty title="The rack is clear" action={<LinkButton href="#empty">Snap a suspect part</LinkButton>}>
            Nothing is on hold. Snap a part if the copper looks wrong.
          </Empty>
          <Empty title="No case matches">Brass, peeling, since 1 July. Drop one of the three.</Empty>
          <Caution level="caution">Mask. Polishing dust.</Caution>
          <Caution level="stop">Acid. Keep away from cyanide.</Caution>
        </div>
        <div className="stack">
          <Broken
            what="The queue did not load"
            safe="The calls that were made are kept."
            todo="Load it again. If it stays, read this mark to the owner."
            mark="k7-2041"
          />
          <Note tone="rust" title="The call was not saved">
            Somebody confirmed this case a minute ago. See what they wrote, then call again.
          </Note>
          <Note tone="amber" title="Strike took 41 s to show copper">
            The window is 30 s. Eleven seconds over: the strike may be due for replacement.
          </Note>
          <Note tone="green" title="Sound. Case closed.">
            First copper in 24 s, tape clean. Off hold.
          </Note>
          <Refused what="Not yours to confirm" who="A second look needs a senior. Ines and Wren can do it." />
          <Note tone="blue" title="You confirmed your own call">
            Allowed here. It shows in the history and stays out of the agreement figures.
          </Note>
        </div>
      </div>
    </Section>
  );
}
