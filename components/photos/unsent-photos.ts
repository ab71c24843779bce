import { openDB, type DBSchema, type IDBPDatabase } from "idb";
import type { PhotoPurpose } from "@/lib/photos/photo-words";

/** A photo that the server does not have yet. It lies in the browser's database, so that a reload loses nothing. */
export interface UnsentPhoto {
  id: string;
  /** Who took it: on a shared tablet nobody else may send it. */
  memberId: number;
  purpose: PhotoPurpose;
  name: string;
  type: string;
  /** UTC ms, the file's own time. */
  takenAt: number;
  content: Blob;
}

interface Shelf extends DBSchema {
  unsent: { key: string; value: UnsentPhoto };
}

let opened: Promise<IDBPDatabase<Shelf>> | null = null;

function shelf(): Promise<IDBPDatabase<Shelf>> {
  opened ??= openDB<Shelf>("coppertell-photos", 1, {
    upgrade: (database) => void database.createObjectStore("unsent", { keyPath: "id" }),
  });
  return opened;
}

/**
 * Keeps a photo until it is sent.
 * @returns false where the browser keeps nothing (a private window, a full phone): then only this page holds it
 */
export async function keepUnsent(photo: UnsentPhoto): Promise<boolean> {
  try {
    await (await shelf()).put("unsent", photo);
    return true;
  } catch {
    // Nothing is lost yet: the page holds the photo and sends it from there.
    return false;
  }
}

export async function dropUnsent(id: string): Promise<void> {
  try {
    await (await shelf()).delete("unsent", id);
  } catch {
    // Where nothing could be kept, nothing is there to be dropped.
  }
}

/** One member's photos that have not been sent, oldest first. */
export async function listUnsent(memberId: number): Promise<UnsentPhoto[]> {
  try {
    const all = await (await shelf()).getAll("unsent");
    return all.filter((photo) => photo.memberId === memberId).toSorted((a, b) => a.takenAt - b.takenAt);
  } catch {
    return [];
  }
}

/** Is it still there, or has another tab sent it meanwhile? */
export async function isUnsent(id: string): Promise<boolean> {
  try {
    return (await (await shelf()).getKey("unsent", id)) !== undefined;
  } catch {
    return true;
  }
}
