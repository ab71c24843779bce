import type Database from "better-sqlite3";
import type { CasebookFilter } from "@/lib/cases/casebook-filter";

/** What the lists of the app come down to, written by hand and prepared once: the floor they are measured against. */

const WHERE: Record<keyof CasebookFilter, string> = {
  classSlug: `case when c.state = 'held' and c.called_class is not null then c.called_class else c.confirmed_class end = @classSlug`,
  causeId: "c.confirmed_cause_id = @causeId",
  stationId: "c.traced_station_id = @stationId",
  baseMetal: "c.base_metal = @baseMetal",
  stageFound: "c.stage_found = @stageFound",
  customerId: "+c.work_order_id in (select id from work_orders where shop_id = @shopId and customer_id = @customerId)",
  status: "(c.state = @status or c.closing = @status)",
  openedById: "c.opened_by_id = @openedById",
  openedFromAt: "c.opened_at >= @openedFromAt",
  openedUntilAt: "c.opened_at < @openedUntilAt",
  exemplars:
    "c.id in (select p.case_id from exemplars e join photos p on p.shop_id = e.shop_id and p.id = e.photo_id where e.shop_id = @shopId and p.state = 'ready')",
  closedFromAt: "c.closed_at >= @closedFromAt",
  closedUntilAt: "c.closed_at < @closedUntilAt",
};

const STATES = ["held", "confirmed", "in-rework", "closed"];

function whereOf(filter: CasebookFilter): string {
  const set = Object.keys(filter) as (keyof CasebookFilter)[]; // a filter's own keys
  const terms = set.map((name) => {
    if (name !== "status") return WHERE[name];
    return STATES.includes(filter.status ?? "") ? "c.state = @status" : "c.closing = @status";
  });
  return ["c.shop_id = @shopId", ...terms].join(" and ");
}

/** The statements of one casebook page: its rows with their names, the capped count, photos and cards. */
export function bareCasebook(client: Database.Database, shopId: number, filter: CasebookFilter, size: number) {
  const time = filter.closedFromAt === undefined ? "c.opened_at" : "c.closed_at";
  const where = whereOf(filter);
  const columns = `c.id, c.ref, c.state, c.closing, c.round, c.opened_at, c.held_at, c.closed_at, c.quantity,
    c.base_metal, c.alloy, c.stage_found, c.note, w.part_name, k.slug, k.title, u.title, s.name, c.cost_cents, c.cost_basis`;
  const joins = `left join work_orders w on w.shop_id = c.shop_id and w.id = c.work_order_id
    left join library_classes k on k.shop_id = c.shop_id and k.slug =
      case when c.state = 'held' and c.called_class is not null then c.called_class else c.confirmed_class end
    left join library_causes u on u.shop_id = c.shop_id and u.id = c.confirmed_cause_id
    left join stations s on s.shop_id = c.shop_id and s.id = c.traced_station_id`;
  const list = (terms: string) =>
    client.prepare(
      `select ${columns} from cases c ${joins} where ${terms} order by ${time} desc, c.id desc limit ${size + 1}`,
    );
  // A second bound on the same side sends SQLite the long way round; the floor must not be measured there.
  const beyond = where.replace("c.closed_at < @closedUntilAt", "+c.closed_at < @closedUntilAt");
  const [begin, goOn] = [list(where), list(`${beyond} and (${time}, c.id) < (@at, @id)`)];
  const count = client.prepare(`select count(*) from (select 1 from cases c where ${where} limit 1001)`).pluck();
  const photos = client.prepare(
    `select case_id, id, purpose, round, position, is_rendered from photos
     where shop_id = @shopId and state = 'ready' and case_id in (select value from json_each(@ids))`,
  );
  const cards = client.prepare(
    `select r.case_id, count(t.id), count(t.ticked_at), sum(t.spent_minutes) from rework_cards r
     left join rework_steps t on t.shop_id = r.shop_id and t.card_id = r.id
     where r.shop_id = @shopId and r.case_id in (select value from json_each(@ids)) group by r.case_id, r.round`,
  );
  return (from: { at: number; id: number } | null) => {
    const given = { ...filter, shopId };
    const rows = (from ? goOn.all({ ...given, at: from.at, id: from.id }) : begin.all(given)) as { id: number }[];
    const ids = JSON.stringify(rows.map((row) => row.id));
    count.get(given);
    photos.all({ shopId, ids });
    cards.all({ shopId, ids });
    return rows;
  };
}

/** The index's own answer, best 200 with their words, without mending and without a second ranking. */
export function bareSearch(client: Database.Database, expression: string) {
  const query = client.prepare(
    `select rowid, ref, job, class, cause, notes from case_search
     where case_search match ? and rank match 'bm25(0, 6, 2, 3, 2, 1)' order by rank limit 200`,
  );
  return () => query.all(expression);
}

/** The head of the queue. */
export function bareQueue(client: Database.Database, shopId: number, stationId: number | null, size: number) {
  const query = client.prepare(
    `select c.id, c.ref, c.round, c.held_at, c.at_risk_cents, c.quantity, c.base_metal, c.alloy, w.part_name,
       c.called_class, c.confirmed_class, k.title
     from cases c join work_orders w on w.shop_id = c.shop_id and w.id = c.work_order_id
     left join library_classes k on k.shop_id = c.shop_id and k.slug = coalesce(c.called_class, c.confirmed_class)
     where c.shop_id = @shopId and c.state = 'held' ${stationId === null ? "" : "and c.traced_station_id = @stationId"}
     order by c.at_risk_cents desc, c.held_at, c.id limit ${size}`,
  );
  return () => query.all(stationId === null ? { shopId } : { shopId, stationId });
}
