import type { Db } from "@/db/open";
import { listCrew, type SignedIn } from "@/db/queries/crew";
import { listTellableClasses } from "@/db/queries/practice-classes";
import { listDrillPeople, listDrills } from "@/db/queries/practice-drills";
import { listPhotosOfClasses } from "@/db/queries/practice-photos";
import { ROLE_TITLES } from "@/lib/cases/case-words";
import { dayWords } from "@/lib/cases/moment-words";
import { drillStanding } from "@/lib/practice/drill";
import { counted } from "@/lib/cases/part-words";

/** Newest drills shown. */
const SHOWN = 30;

/** What a senior needs to set a drill and to see how the set ones go. */
export function loadDrills(db: Db, member: SignedIn, now: number) {
  const { shopId, memberId } = member;
  const shelf = listTellableClasses(db, shopId);
  const slugs = shelf.map((each) => each.slug);
  const photos = listPhotosOfClasses(db, { shopId, memberId, now }, slugs);
  const titleOf = (slug: string) => (shelf.find((each) => each.slug === slug)?.title ?? slug).toLowerCase();
  return {
    classes: shelf.map(({ slug, title }) => ({
      slug,
      title,
      photos: photos.filter((photo) => photo.classSlug === slug).length,
    })),
    people: listCrew(db, shopId).map((person) => ({
      memberId: person.memberId,
      name: person.name,
      roleWords: person.roles.map((role) => ROLE_TITLES[role]).join(", "),
    })),
    drills: listDrills(db, shopId, SHOWN).map((drill) => {
      const inClasses = drill.classSlugs.length === 0 ? "" : ` of ${drill.classSlugs.map(titleOf).join(", ")}`;
      const due = drill.dueAt === null ? "" : ` By ${dayWords(drill.dueAt - 1, member.shop.timeZone)}.`;
      return {
        id: drill.id,
        title: drill.title,
        isWithdrawn: drill.withdrawnAt !== null,
        words: `${counted(drill.photoCount, "photo")}${inClasses}.${due} Set by ${drill.setBy}, ${dayWords(drill.setAt, member.shop.timeZone)}.`,
        people: listDrillPeople(db, shopId, drill.id).map((person) => ({
          memberId: person.memberId,
          name: person.name,
          // The shop had that many photos when it was set; what has left practice since is the person's page to say.
          standing: drillStanding(person, drill.photoCount, drill.photoCount - person.called),
        })),
      };
    }),
  };
}
