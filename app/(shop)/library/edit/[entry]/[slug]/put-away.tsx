import Link from "next/link";
import { DropDraftForm, RemoveEntryForm } from "@/components/library/entry-small-forms";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { countUses } from "@/db/queries/library-uses";
import { useLines as linesOfUse } from "@/lib/library/entry-uses";
import { whyKept } from "@/lib/server/library/remove-entry";
import { dropDraft, removeEntry } from "../../actions";
import type { LoadedEntry } from "../../load-entry";

/** Dropping one's draft, and taking the entry out: with what points at it where something does. */
export function PutAway({ loaded, member }: { loaded: LoadedEntry; member: SignedIn }) {
  const { entry, slug, own, live, standing } = loaded;
  const uses = live ? linesOfUse(entry, slug, countUses(getDb(), member.shopId, entry, slug)) : [];
  const reason = whyKept(entry, slug, uses);
  return (
    <div className="cols entry-away">
      {own && (
        <Section title="Your draft" level={2}>
          <DropDraftForm entry={entry} slug={slug} action={dropDraft} />
        </Section>
      )}
      {live && (
        <Section title="Remove it">
          {reason === null ? (
            <RemoveEntryForm entry={entry} slug={slug} baseRevision={standing} action={removeEntry} />
          ) : (
            <>
              <p>{uses.length === 0 ? reason : "It cannot be removed while these point at it."}</p>
              <ul className="lib-list entry-uses">
                {uses.map((use) => (
                  <li key={use.words}>{use.href ? <Link href={use.href}>{use.words}</Link> : use.words}</li>
                ))}
              </ul>
            </>
          )}
        </Section>
      )}
    </div>
  );
}
