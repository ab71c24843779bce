import type { SnapBody } from "@/lib/cases/snap-draft";

/** Why the server would not take a snap: a sentence, and one for each field that has to change. */
export interface SnapFault {
  message: string;
  fields: Record<string, string>;
}

/**
 * `hung`: the case is open and has its number. `refused`: something has to change first.
 * `waits`: it did not get there, or the server could not take it now; the same snap may be sent again.
 */
export type SendAnswer =
  { kind: "hung"; ref: string } | { kind: "refused"; fault: SnapFault } | { kind: "waits"; why: Waits };

/** `slow`: no answer in time, though a line is there. */
export type Waits = "no-signal" | "slow" | "signed-out" | "server";

/** Answers that a second try would not change. */
const REFUSALS = new Set([400, 403, 404, 409, 413]);

/**
 * Sends a snap. Safe to repeat: its `snapKey` opens one case however often it arrives.
 * @param waitMs how long to wait for the answer before it counts as no signal
 */
export async function sendSnap(body: SnapBody, waitMs: number): Promise<SendAnswer> {
  let response: Response;
  let said: unknown;
  try {
    response = await fetch("/api/cases", {
      method: "POST",
      headers: { "Content-Type": "application/json" },
      body: JSON.stringify(body),
      signal: AbortSignal.timeout(waitMs),
    });
    said = await response.json();
  } catch (error) {
    // A line that breaks off and a Wi-Fi portal that answers with a page of its own are no signal too.
    const isLate = error instanceof DOMException && error.name === "TimeoutError";
    return { kind: "waits", why: isLate ? "slow" : "no-signal" };
  }
  const answer = isRecord(said) ? said : {};
  if (response.ok && typeof answer.ref === "string") return { kind: "hung", ref: answer.ref };
  if (response.status === 401) return { kind: "waits", why: "signed-out" };
  if (!REFUSALS.has(response.status)) return { kind: "waits", why: "server" };
  return { kind: "refused", fault: faultIn(answer) };
}

/** Reads a problem+json answer. */
function faultIn(answer: Record<string, unknown>): SnapFault {
  const given = isRecord(answer.fields) ? answer.fields : {};
  const fields = Object.fromEntries(
    Object.entries(given).filter((entry): entry is [string, string] => typeof entry[1] === "string"),
  );
  const title = typeof answer.title === "string" ? answer.title : "The snap was not taken. Check what is filled in.";
  // The sentence of the first field says it without the field's inner name.
  return { message: Object.values(fields)[0] ?? title, fields };
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}
