import type Database from "better-sqlite3";

/** Tables whose rows are only ever added. */
const APPEND_ONLY = [
  "calls",
  "case_events",
  "case_costs",
  "audit_entries",
  "library_revisions",
  "strip_rows",
  "part_checks",
  "practice_answers",
] as const;

const appendOnly = APPEND_ONLY.flatMap((table) =>
  ["update", "delete"].map(
    (change) => `create trigger if not exists ${table}_no_${change} before ${change} on ${table}
      begin select raise(abort, '${table} is append-only'); end`,
  ),
);

/** The full-text index follows `case_texts`. */
const searchFollows = [
  `create trigger if not exists case_texts_added after insert on case_texts begin
     insert into case_search (rowid, scope, ref, job, class, cause, notes)
     values (new.case_id, new.scope, new.ref, new.job, new.class, new.cause, new.notes);
   end`,
  `create trigger if not exists case_texts_changed after update on case_texts begin
     insert into case_search (case_search, rowid, scope, ref, job, class, cause, notes)
     values ('delete', old.case_id, old.scope, old.ref, old.job, old.class, old.cause, old.notes);
     insert into case_search (rowid, scope, ref, job, class, cause, notes)
     values (new.case_id, new.scope, new.ref, new.job, new.class, new.cause, new.notes);
   end`,
];

/** Makes every trigger that is missing. Runs after each migration, because rebuilding a table drops its triggers. */
export function installTriggers(client: Database.Database): void {
  for (const statement of [...appendOnly, ...searchFollows]) client.exec(statement);
}
