import { CallForm } from "@/components/cases/call-form";
import { CaseAmendForm, CaseDoing, CaseWhyForm } from "@/components/cases/case-forms";
import { ReworkDispose } from "@/components/cases/rework-dispose";
import { Section } from "@/components/ui/section";
import type { CaseFacts } from "@/db/queries/case-page";
import type { SignedIn } from "@/db/queries/crew";
import { canHappen } from "@/lib/cases/case-state";
import { suggestedCalls } from "@/lib/cases/suggested-calls";
import { can } from "@/lib/permissions";
import { addCall, amendCase, disposeCase, reopenCase, takeBack } from "../actions";

interface CaseDoingsProps {
  member: SignedIn;
  facts: CaseFacts;
  classes: readonly { slug: string; title: string }[];
}

const OFFERED = 5;

/** What this person may do to the case as it stands; nothing at all shows no section. */
export function CaseDoings({ member, facts, classes }: CaseDoingsProps) {
  const { ref, state } = facts;
  const mayConfirm = can(member, "case.confirm");
  const mayAmend = can(member, "case.amend", { shopId: member.shopId, ownerId: facts.openedById });
  const doings = [
    state === "held" && can(member, "case.call") && (
      <CaseDoing key="call" title="Add your call">
        <CallForm
          caseRef={ref}
          classes={classes}
          suggested={suggestedCalls(
            facts.symptoms,
            classes.map((each) => each.slug),
            OFFERED,
          )}
          onCall={addCall}
        />
      </CaseDoing>
    ),
    state === "held" && mayAmend && <CaseAmendForm key="amend" caseRef={ref} facts={facts} action={amendCase} />,
    mayConfirm && canHappen(state, "taken-back") && (
      <CaseWhyForm
        key="back"
        caseRef={ref}
        title="Take the confirmation back"
        hint="The case goes back to the second look as a further round. What was written stays."
        button="Take it back"
        saidWords={`${ref} waits for a second look again.`}
        action={takeBack}
      />
    ),
    mayConfirm && canHappen(state, "disposed") && <ReworkDispose key="dispose" caseRef={ref} onDispose={disposeCase} />,
    mayConfirm && canHappen(state, "reopened") && (
      <CaseWhyForm
        key="reopen"
        caseRef={ref}
        title="Open the case again"
        hint="The case goes back to the second look as a further round. What was written stays."
        button="Open it again"
        saidWords={`${ref} is open again.`}
        action={reopenCase}
      />
    ),
  ].filter(Boolean);
  if (doings.length === 0) return null;
  return (
    <Section title="What you can do here" className="doings">
      {doings}
    </Section>
  );
}
