import { shortName } from "@/lib/crew/initials";
import { dayAndTime } from "./shop-clock";

/** A step of a rework card as it is stored. */
export interface StoredStep {
  id: number;
  title: string;
  detail: string;
  plannedMinutes: number;
  cautions: readonly { level: "caution" | "stop"; text: string }[];
  tickedAt: number | null;
  tickedBy: string | null;
  spentMinutes: number | null;
}

/** A step as its page shows it. */
export interface WrittenStep extends Pick<StoredStep, "id" | "title" | "detail" | "plannedMinutes" | "cautions"> {
  /** Who ticked it and when, in words; null while it is open. */
  ticked: { by: string; at: string; spentMinutes: number } | null;
}

/** @param timeZone IANA name of the shop's zone */
export function writeStep(step: StoredStep, timeZone: string): WrittenStep {
  const { id, title, detail, plannedMinutes, cautions, tickedAt, tickedBy, spentMinutes } = step;
  const ticked =
    tickedAt === null
      ? null
      : { by: shortName(tickedBy ?? ""), at: dayAndTime(tickedAt, timeZone), spentMinutes: spentMinutes ?? 0 };
  return { id, title, detail, plannedMinutes, cautions, ticked };
}
