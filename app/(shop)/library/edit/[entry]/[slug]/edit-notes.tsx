import Link from "next/link";
import { Note } from "@/components/ui/note";
import type { SignedIn } from "@/db/queries/crew";
import { momentWords } from "@/lib/cases/moment-words";
import { routes } from "@/lib/routes";
import type { LoadedEntry } from "../../load-entry";

interface EditNotesProps {
  loaded: LoadedEntry;
  member: SignedIn;
  /** A draft was kept a moment ago. */
  isKept: boolean;
}

/** What an editor should know first: their own draft, who came first, who else is at it. */
export function EditNotes({ loaded, member, isKept }: EditNotesProps) {
  const { entry, slug, own, merge, newest, others, live } = loaded;
  const when = (at: number) => momentWords(at, member.shop.timeZone, Date.now());
  const who = newest?.memberName ?? "Somebody";
  return (
    <div className="entry-notes">
      {isKept && !merge && (
        <Note tone="green" title="Your draft is kept" role="status">
          Only those who edit the library see it. Publish it when it is ready.
        </Note>
      )}
      {merge && (
        <Note tone="amber" title={`${who} published this since you began`} role="alert">
          {newest && `${when(newest.at)}. `}Your words are kept as your draft; nothing of yours is lost. Say below which
          stand.
        </Note>
      )}
      {!live && newest?.state === "removed" && (
        <Note tone="amber" title={`${who} removed this`}>
          {when(newest.at)}. Its words are below; publish to bring it back.
        </Note>
      )}
      {own && !isKept && !merge && (
        <Note tone="blue" title={`Your draft of ${when(own.at)}`}>
          The page still shows what was published last.
        </Note>
      )}
      {others.map((draft) => (
        <Note key={draft.id} tone="grey" title={`${draft.memberName ?? "Somebody"} has a draft of it too`}>
          Kept {when(draft.at)}. Whoever publishes second sees both.{" "}
          <Link href={routes.libraryRevisions(entry, slug, { after: String(draft.id) })}>Read it</Link>
        </Note>
      ))}
    </div>
  );
}
