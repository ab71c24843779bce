import type { PortEntry, PortView } from "@/components/library/port-entries";
import type { Db } from "@/db/open";
import { listShelf } from "@/db/queries/library-entries";
import { compareEntry } from "@/lib/library/compare-entry";
import type { Shelf } from "@/lib/library/library-entry";
import { setAgainst, type SetAgainst } from "@/lib/server/library/bring-in";
import { nameWords } from "../edit/entry-choices";

/** What a file would bring: each entry that is new, or says something else than the shop's own, and what it says. */
export function portView(db: Db, shopId: number, file: Shelf): PortView {
  const entries = setAgainst(db, shopId, file);
  const words = nameWords(file, listShelf(db, shopId));
  const view = (entry: SetAgainst): PortEntry => ({
    pick: `${entry.kind}/${entry.slug}@${entry.revision}`,
    kind: entry.kind,
    title: entry.title,
    changes: entry.own === null ? [] : compareEntry(entry.kind, { ...entry.own }, { ...entry.body }, words),
  });
  return {
    fresh: entries.filter((entry) => entry.standing === "new").map(view),
    changed: entries.filter((entry) => entry.standing === "changed").map(view),
    same: entries.filter((entry) => entry.standing === "same").length,
  };
}
