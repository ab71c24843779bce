import { dayOf, nextDay, shiftDay } from "@/lib/costs/period";
import { dayWords } from "@/lib/cases/moment-words";

/** Photos in one sitting, where no drill says otherwise. */
export const SITTING = 10;

/** How far back a person's own snap or second look still gives its photo away to them. */
export const OWN_DAYS = 14;

/** A photo's way back, in words: "today", "tomorrow", "in 5 days", "on 3 Mar 2027". */
export function comesBackWords(dueAt: number, now: number, timeZone: string): string {
  const today = dayOf(now, timeZone);
  const day = dayOf(dueAt, timeZone);
  if (day <= today) return "today";
  if (day === nextDay(today)) return "tomorrow";
  for (let days = 2; days <= 30; days += 1) if (day === shiftDay(today, days)) return `in ${days} days`;
  return `on ${dayWords(dueAt, timeZone)}`;
}

/** A stretch of days in which photos come back. */
export interface ComingBack {
  words: string;
  photos: number;
}

/** How many photos come back when: today with what is overdue, tomorrow, within a week, within a month, later. */
export function comingBack(dueAts: readonly number[], now: number, timeZone: string): ComingBack[] {
  const today = dayOf(now, timeZone);
  const ends = [
    { words: "Today", until: today },
    { words: "Tomorrow", until: nextDay(today) },
    { words: "Within a week", until: shiftDay(today, 7) },
    { words: "Within 30 days", until: shiftDay(today, 30) },
    { words: "Later", until: "9999-12-31" },
  ];
  const days = dueAts.map((dueAt) => dayOf(dueAt, timeZone));
  return ends.map(({ words, until }, index) => {
    const after = ends[index - 1]?.until ?? "";
    return { words, photos: days.filter((day) => day > after && day <= until).length };
  });
}

/** "Six photos are due", "Ten new photos to call", "Nothing comes back today": the sentence practice opens with. */
export function waitingWords(due: number, fresh: number): string {
  if (due > 0) return `${capital(countWords(due))} ${due === 1 ? "photo is" : "photos are"} due`;
  if (fresh > 0) return `${capital(countWords(fresh))} new ${fresh === 1 ? "photo" : "photos"} to call`;
  return "Nothing comes back today";
}

const SMALL = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];
const countWords = (count: number) => SMALL[count] ?? String(count);
const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

/** What practice has for a person today, in one line: a set drill first, then what is due, then what is new. Null: nothing. */
export function practiseWords({ due, fresh, drills }: { due: number; fresh: number; drills: number }): string | null {
  const set = drills > 0 ? `${drills === 1 ? "1 drill is" : `${drills} drills are`} set for you` : null;
  const waits =
    due > 0
      ? `${due} ${due === 1 ? "photo is" : "photos are"} due`
      : fresh > 0
        ? `${fresh} new ${fresh === 1 ? "photo" : "photos"}`
        : null;
  const words = [set, waits].filter(Boolean).join(", ");
  return words === "" ? null : `Practise: ${words}`;
}
