import fs from "node:fs";
import path from "node:path";
import Database from "better-sqlite3";
import { E2E_DATA, E2E_UPLOADS } from "./environment";

/** Reads what the server under test has stored: the tests look behind the screen. */
export function stored<Row>(sql: string, ...values: (string | number)[]): Row[] {
  const db = new Database(path.join(E2E_DATA, "coppertell.db"), { readonly: true });
  try {
    return db.prepare(sql).all(...values) as Row[];
  } finally {
    db.close();
  }
}

export interface StoredSize {
  photo_id: string;
  size: string;
  path: string;
  bytes: number;
  width: number;
  height: number;
}

/** The stored sizes of a case's photos of one round and purpose, thumb to original. */
export function sizesOf(ref: string, purpose: string, round: number): StoredSize[] {
  return stored<StoredSize>(
    `select s.photo_id, s.size, s.path, s.bytes, s.width, s.height
     from photo_sizes s join photos p on p.id = s.photo_id join cases c on c.id = p.case_id
     where c.ref = ? and p.purpose = ? and p.round = ? and p.state = 'ready' order by p.position, s.size`,
    ref,
    purpose,
    round,
  );
}

export const fileOf = (size: StoredSize) => path.join(E2E_UPLOADS, size.path);
export const bytesOf = (size: StoredSize) => fs.statSync(fileOf(size)).size;
