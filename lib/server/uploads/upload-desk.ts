import "server-only";
import type { NextRequest } from "next/server";
import { getDb } from "@/db/client";
import type { Db } from "@/db/open";
import { readEnv } from "@/lib/env";
import { uploadsRoot } from "@/lib/server/storage";
import { photoHandler } from "./photo-handler";
import { uploadConfig, type UploadConfig } from "./upload-config";

/** Everything that both sides of an upload need: ours, and the stand-in's. */
export interface UploadDesk {
  db: Db;
  root: string;
  config: UploadConfig;
  /** What `onUploadComplete` answered, by file key, while the stand-in waits for it. */
  answers: Map<string, (callbackData: unknown) => void>;
  /** The upload kit's own route handler. */
  kit: (request: NextRequest) => Promise<Response>;
}

/** Puts a desk together. */
export function makeUploadDesk(parts: Pick<UploadDesk, "db" | "root" | "config">): UploadDesk {
  const answers: UploadDesk["answers"] = new Map();
  return { ...parts, answers, kit: photoHandler({ ...parts, answers }) };
}

let desk: UploadDesk | undefined;

/** The server's desk, made at its first use so that a build needs no token. */
export function uploadDesk(): UploadDesk {
  desk ??= makeUploadDesk({ db: getDb(), root: uploadsRoot(), config: uploadConfig(readEnv()) });
  return desk;
}
