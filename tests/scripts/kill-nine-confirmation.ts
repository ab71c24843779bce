import { randomUUID } from "node:crypto";
import { makeConfirmation, makeSnap } from "@/tests/fixtures/shop-factory";
import { killWithin, spanOf, type PhaseResult, type World } from "./kill-nine-world";

const CASES_A_ROUND = 6;

/** Seniors confirm while the server is killed. A case is confirmed whole, with call, card, steps and history, or not at all. */
export async function killDuringConfirmation(world: World): Promise<PhaseResult> {
  const counts = { sent: 0, "answered before the kill": 0, "whole though unanswered": 0, untouched: 0 };
  const result: PhaseResult = { faults: [], counts };
  const first = confirmations(world, await snapCases(world));
  const spanMs = await spanOf(() => Promise.all(first.map((body) => confirm(world, body))));
  for (let round = 0; round < world.kills; round++) {
    const refs = await snapCases(world);
    const bodies = confirmations(world, refs);
    const answered = new Set<string>();
    const sending = bodies.map((body) =>
      confirm(world, body).then(
        (status) => status < 300 && answered.add(body.ref),
        () => false,
      ),
    );
    await killWithin(world, spanMs);
    await Promise.all(sending);
    for (const ref of refs) {
      const state = wholeness(world, ref);
      if (state === "half") result.faults.push(`case ${ref} is half confirmed`);
      if (answered.has(ref) && state !== "whole") result.faults.push(`case ${ref} was confirmed and is ${state}`);
      if (state === "untouched") counts.untouched += 1;
      if (state === "whole" && !answered.has(ref)) counts["whole though unanswered"] += 1;
    }
    counts.sent += refs.length;
    counts["answered before the kill"] += answered.size;
    await world.server.start();
    result.faults.push(...(await finish(world, bodies)));
  }
  return result;
}

async function snapCases(world: World): Promise<string[]> {
  const snaps = Array.from({ length: CASES_A_ROUND }, () => makeSnap(world.server.shop, { snapKey: randomUUID() }));
  for (const snap of snaps) {
    const status = await post(world, "/api/cases", world.cookies.plater, snap);
    if (status >= 300) throw new Error(`No case was opened: ${status}`);
  }
  const db = world.server.openDb();
  const find = db.$client.prepare("select ref from cases where snap_key = ?");
  const refs = snaps.map((snap) => (find.get(snap.snapKey) as { ref: string }).ref);
  db.$client.close();
  return refs;
}

function confirmations(world: World, refs: string[]) {
  const db = world.server.openDb();
  const bodies = refs.map((ref) => makeConfirmation(db, world.server.shop, ref));
  db.$client.close();
  return bodies;
}

function confirm(world: World, body: ReturnType<typeof makeConfirmation>): Promise<number> {
  return post(world, `/api/cases/${body.ref}/confirmation`, world.cookies.senior, body);
}

async function post({ server }: World, path: string, cookie: string, body: unknown): Promise<number> {
  const headers = { cookie, "content-type": "application/json" };
  const answer = await fetch(`${server.origin}${path}`, { method: "POST", headers, body: JSON.stringify(body) });
  // Read to its end: an answer is one only when it has come whole.
  await answer.arrayBuffer();
  return answer.status;
}

/** Everything that a confirmation with two steps writes, counted in one row. */
const TRACES = `select (c.state = 'confirmed') + (c.confirmed_by_id is not null)
  + (select count(*) from case_events e where e.case_id = c.id and e.event = 'confirmed')
  + (select count(*) from calls k where k.case_id = c.id and k.kind = 'second-look')
  + (select count(*) from rework_cards r where r.case_id = c.id)
  + (select count(*) from rework_steps s join rework_cards r on r.id = s.card_id where r.case_id = c.id) as traces
  from cases c where c.ref = ?`;
const ALL_TRACES = 7;

function wholeness({ server }: World, ref: string): "whole" | "untouched" | "half" {
  const db = server.openDb();
  const { traces } = db.$client.prepare(TRACES).get(ref) as { traces: number };
  db.$client.close();
  if (traces === ALL_TRACES) return "whole";
  return traces === 0 ? "untouched" : "half";
}

/** After the restart the senior sends again what was not answered: it works, or the case says that it is done. */
async function finish(world: World, bodies: ReturnType<typeof confirmations>): Promise<string[]> {
  const faults: string[] = [];
  for (const body of bodies) {
    const before = wholeness(world, body.ref);
    const status = await confirm(world, body);
    const isRight = before === "whole" ? status === 409 : status < 300;
    if (!isRight) faults.push(`case ${body.ref}, ${before} before, answered ${status}`);
    if (wholeness(world, body.ref) !== "whole") faults.push(`case ${body.ref} is not whole after a second try`);
  }
  return faults;
}
