import { LinkButton } from "@/components/ui/button";
import { Lead } from "@/components/ui/lead";
import type { CaseFacts } from "@/db/queries/case-page";
import { STATE_WORDS } from "@/lib/cases/case-state";
import { momentWords } from "@/lib/cases/moment-words";
import { routes } from "@/lib/routes";

interface AlreadyLookedProps {
  facts: CaseFacts;
  nextHref: string;
  now: number;
  timeZone: string;
}

/** The case has had its second look by now: who took it, and where to go on. */
export function AlreadyLooked({ facts, nextHref, now, timeZone }: AlreadyLookedProps) {
  const by =
    facts.confirmedBy && facts.confirmedAt !== null
      ? `${facts.confirmedBy} looked at it ${momentWords(facts.confirmedAt, timeZone, now)}. `
      : "";
  return (
    <div className="page sl-done">
      <Lead size="page" below={`${by}It is ${STATE_WORDS[facts.state]}.`}>
        {facts.ref} does not wait any more
      </Lead>
      <div className="btns">
        <LinkButton variant="main" href={nextHref} glyph="ui-eye">
          Go on in the queue
        </LinkButton>
        <LinkButton href={routes.case(facts.ref)}>See the case</LinkButton>
      </div>
    </div>
  );
}
