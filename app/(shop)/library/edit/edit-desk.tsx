import Link from "next/link";
import { Glyph } from "@/components/ui/glyph";
import { LinkButton } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listDrafts } from "@/db/queries/library-revisions";
import { momentWords } from "@/lib/cases/moment-words";
import { shareSumOff } from "@/lib/library/entry-links";
import { ENTRY_KINDS, entryTitle } from "@/lib/library/entry-kinds";
import { routes } from "@/lib/routes";

/** For those who edit: the drafts that wait, and what they can begin. */
export function EditDesk({ member }: { member: SignedIn }) {
  const drafts = listDrafts(getDb(), member.shopId);
  const when = (at: number) => momentWords(at, member.shop.timeZone, Date.now());
  return (
    <Section
      title={drafts.length === 0 ? "Edit" : "Drafts that wait"}
      aside={drafts.length === 0 ? "No draft waits" : `${drafts.length}, not published yet`}
      className="no-print"
    >
      {drafts.length > 0 && (
        <ul className="draft-rows">
          {drafts.map((draft) => {
            const kind = ENTRY_KINDS.find((each) => each === draft.entry) ?? "class";
            const mine = draft.memberId === member.memberId;
            return (
              <li key={draft.id} className="row">
                <Glyph name="ui-library" />
                <span>
                  <Link
                    className="solo"
                    href={
                      mine
                        ? routes.libraryEdit(kind, draft.slug)
                        : routes.libraryRevisions(kind, draft.slug, { after: String(draft.id) })
                    }
                  >
                    {entryTitle(draft.body)}
                  </Link>
                  <small className="quiet">
                    {kind}, {mine ? "yours" : (draft.memberName ?? "somebody’s")}, {when(draft.at)}
                  </small>
                </span>
              </li>
            );
          })}
        </ul>
      )}
      <div className="lib-desk">
        {ENTRY_KINDS.map((kind) => (
          <LinkButton key={kind} href={routes.libraryNew(kind)}>
            New {kind}
          </LinkButton>
        ))}
        <LinkButton variant="quiet" href={routes.libraryPort()}>
          Take out or bring in
        </LinkButton>
      </div>
    </Section>
  );
}

interface ClassDeskProps {
  member: SignedIn;
  slug: string;
  otherLikelihood: number;
  /** The shelf's shares of all its causes; null while the page shows only some of them. */
  likelihoods: readonly number[] | null;
}

/** On a class's page: the ways to its editor, the drafts of it that wait, and shares that do not add up. */
export function ClassDesk({ member, slug, otherLikelihood, likelihoods }: ClassDeskProps) {
  const sum = likelihoods && shareSumOff(otherLikelihood, likelihoods);
  const drafts = listDrafts(getDb(), member.shopId, { entry: "class", slug });
  const names = drafts.map((draft) => (draft.memberId === member.memberId ? "you" : (draft.memberName ?? "somebody")));
  return (
    <div className="lib-class-desk no-print">
      <div className="lib-desk">
        <LinkButton href={routes.libraryEdit("class", slug)}>Edit</LinkButton>
        <LinkButton href={routes.libraryRevisions("class", slug)}>Revisions</LinkButton>
        <LinkButton variant="quiet" href={routes.libraryNew("cause", { of: slug })}>
          New cause
        </LinkButton>
      </div>
      {names.length > 0 && (
        <Note tone="blue" title={`A draft of this page waits: ${names.join(", ")}`}>
          What you read here is what was published last.
        </Note>
      )}
      {sum !== null && (
        <Note tone="amber" title={`The shelf’s shares of its causes come to ${Math.round(sum * 100)}%`}>
          With the share of another cause they should come to 100%. Edit the causes that are off.
        </Note>
      )}
    </div>
  );
}
