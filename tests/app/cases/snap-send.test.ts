import { randomUUID } from "node:crypto";
import { afterEach, describe, expect, it, vi } from "vitest";
import { deliver, keepSnap, listSnaps, type KeptSnap } from "@/components/cases/snap-outbox";
import { sendSnap } from "@/components/cases/snap-send";
import { newDraft, snapBody } from "@/lib/cases/snap-draft";

const draft = newDraft(
  {
    workOrderId: 1,
    runId: null,
    baseMetal: "brass",
    alloy: "",
    method: "bath",
    foundStationId: 3,
    solutionIds: [],
    stageFound: "at-strike",
  },
  randomUUID(),
);

function answering(status: number, body: unknown): void {
  vi.stubGlobal("fetch", async () => Response.json(body, { status }));
}

afterEach(() => vi.unstubAllGlobals());

describe("sending a snap", () => {
  it("gives the case's number once it hangs", async () => {
    answering(201, { ref: "CT-2607-0042" });
    expect(await sendSnap(snapBody(draft), 1000)).toEqual({ kind: "hung", ref: "CT-2607-0042" });
  });

  it("waits for the signal when the line is dead", async () => {
    vi.stubGlobal("fetch", async () => {
      throw new TypeError("Failed to fetch");
    });
    expect(await sendSnap(snapBody(draft), 1000)).toEqual({ kind: "waits", why: "no-signal" });
  });

  it("does not keep a wet hand waiting for a line that stalls", async () => {
    vi.stubGlobal(
      "fetch",
      (_address: string, { signal }: { signal: AbortSignal }) =>
        new Promise((_answer, refuse) => signal.addEventListener("abort", () => refuse(signal.reason))),
    );
    expect(await sendSnap(snapBody(draft), 20)).toEqual({ kind: "waits", why: "slow" });
  });

  it("takes a page of a captive Wi-Fi portal for no signal", async () => {
    vi.stubGlobal("fetch", async () => new Response("<html>Sign in to the Wi-Fi</html>", { status: 200 }));
    expect(await sendSnap(snapBody(draft), 1000)).toEqual({ kind: "waits", why: "no-signal" });
  });

  it("says which field the server would not take", async () => {
    // The form of a fault on the wire: RFC 9457 with our `fields`, from lib/fault.ts.
    answering(400, {
      title: "Not saved.",
      status: 400,
      code: "invalid",
      fields: { runId: "That run belongs to another job." },
    });
    expect(await sendSnap(snapBody(draft), 1000)).toEqual({
      kind: "refused",
      fault: { message: "That run belongs to another job.", fields: { runId: "That run belongs to another job." } },
    });
  });

  it("keeps the snap for later when the person is signed out or the server is down", async () => {
    answering(401, { title: "You are signed out." });
    expect(await sendSnap(snapBody(draft), 1000)).toEqual({ kind: "waits", why: "signed-out" });
    answering(500, { title: "Something broke." });
    expect(await sendSnap(snapBody(draft), 1000)).toEqual({ kind: "waits", why: "server" });
  });
});

describe("a browser that keeps nothing", () => {
  const snap: KeptSnap = {
    snapKey: draft.snapKey,
    memberId: 1,
    draft,
    body: snapBody(draft),
    title: "J-1",
    keptAt: 0,
    fault: null,
  };

  it("says so, and still sends the snap", async () => {
    // Node has no IndexedDB, as a private window has none.
    expect(await keepSnap(snap)).toBe(false);
    expect(await listSnaps(1)).toEqual([]);
    answering(201, { ref: "CT-2607-0001" });
    expect(await deliver(snap)).toEqual({ kind: "hung", ref: "CT-2607-0001" });
  });
});
