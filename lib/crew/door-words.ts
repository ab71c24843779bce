import { routes } from "@/lib/routes";

/** Why somebody stands at the sign-in page again; the address bar names one of these and nothing else shows. */
export const DOOR_NOTES = {
  password: { title: "The new password holds", words: "Sign in with it. Every other device is signed out." },
  joined: { title: "You are in the crew", words: "Sign in with the password that you just chose." },
  out: { title: "Signed out", words: "This device is clear for the next person." },
  everywhere: { title: "Signed out everywhere", words: "Every device asks for the password again." },
} as const;
export type DoorNote = keyof typeof DOOR_NOTES;

/** The sign-in page with such a note. */
export function doorPath(why: DoorNote): string {
  return `${routes.signIn()}?why=${why}`;
}

/** The note that an address asks for; null when it asks for none or for one that does not exist. */
export function doorNote(why: string | undefined): (typeof DOOR_NOTES)[DoorNote] | null {
  return why !== undefined && Object.hasOwn(DOOR_NOTES, why) ? DOOR_NOTES[why as DoorNote] : null;
}
