import "server-only";
import type { NextRequest } from "next/server";
import { createRouteHandler, createUploadthing, UTFiles } from "uploadthing/next";
import { UploadThingError } from "uploadthing/server";
import type { RouteHandlerConfig } from "uploadthing/types";
import { getPhoto, getPhotoOwner, refusePhoto } from "@/db/queries/photos";
import { getUploadedFile } from "@/db/queries/uploads";
import type { SignedIn } from "@/db/queries/crew";
import { FaultError, fault } from "@/lib/fault";
import { incomingPath } from "@/lib/photos/photo-path";
import { REFUSALS, refusalBeforeSending } from "@/lib/photos/photo-refusals";
import { photoUploadInput, uploadTicket, type PhotoUploadInput, type UploadTicket } from "@/lib/photos/photo-upload.schema";
import { inUploads } from "@/lib/server/storage";
import { fetchHosted, removeHosted, type HostedFile } from "./hosted-file";
import { answerKit } from "./kit-calls";
import { takeInPhoto } from "./take-in";
import type { UploadDesk } from "./upload-desk";

type Desk = Omit<UploadDesk, "kit">;

/**
 * Who sends a request. Resolved before the kit sees it: the kit runs its hooks on a scheduler of its own, where the
 * request's context (and so its cookie) could be another request's.
 */
const senders = new WeakMap<Request, SignedIn>();

/** Lets the kit's hooks know who sends this request. */
export function nameSender(request: NextRequest, member: SignedIn): void {
  senders.set(request, member);
}

/** The upload kit's handler with the one route that photos use, its slug `photo`. */
export function photoHandler(desk: Desk): UploadDesk["kit"] {
  return createRouteHandler({ router: photoRouter(desk), config: kitConfig(desk) }).POST;
}

/** What the kit is told, so that nothing is left to what it would guess. */
export function kitConfig(desk: Desk): RouteHandlerConfig {
  const { token, callbackUrl, ingestUrl, isLocal } = desk.config;
  return {
    token,
    callbackUrl,
    // Not the development protocol, in development either: the stand-in speaks the real one.
    isDev: false,
    // One step lower the kit logs every signed address.
    logLevel: "Warning",
    ...(ingestUrl ? { ingestUrl } : {}),
    ...(isLocal ? { fetch: (url, init) => answerKit(desk, url, init) } : {}),
  };
}

export function photoRouter(desk: Desk) {
  const route = createUploadthing({ errorFormatter });
  return {
    // Any declared type: browsers name none for HEIC and a wrong one for a renamed file. The content decides.
    photo: route(
      { blob: { maxFileSize: "32MB", maxFileCount: 1 } },
      // The same photo has the same key each time, so that a retry goes on where the last try stopped. The kit's types
      // leave out the photo's number, which it does pass.
      { awaitServerData: true, getFileHashParts: (file) => [(file as typeof file & { customId: string }).customId] },
    )
      .input(photoUploadInput)
      .middleware(({ req, input, files }) => admit(desk, senders.get(req), input, files))
      .onUploadComplete(({ metadata, file }) => complete(desk, uploadTicket.parse(metadata), file)),
  };
}
export type PhotoRouter = ReturnType<typeof photoRouter>;

type NamedFile = { name: string; size: number; type: string };

function admit(desk: Desk, member: SignedIn | undefined, input: PhotoUploadInput, files: readonly NamedFile[]) {
  if (!member) throw kitError(fault("signed-out", "You are signed out. Sign in again; your photos stay on this phone."));
  const [file] = files;
  if (!file || files.length > 1) throw kitError(fault("invalid", REFUSALS.oneAtATime));
  if (!isMine(desk, member, input.photoId)) throw kitError(fault("refused", REFUSALS.notYours));
  const refusal = refusalBeforeSending(file);
  if (refusal) {
    // A case that awaits this very photo says why it never came.
    refusePhoto(desk.db, member.shopId, input.photoId, refusal);
    throw kitError(fault("unsupported", refusal));
  }
  const { photoId, purpose, takenAt = null } = input;
  const ticket: UploadTicket = { photoId, shopId: member.shopId, memberId: member.memberId, purpose, takenAt };
  return { ...ticket, [UTFiles]: [{ ...file, customId: photoId }] };
}

function isMine({ db }: Desk, member: SignedIn, photoId: string): boolean {
  const begun = uploadTicket.safeParse(getUploadedFile(db, photoId)?.callback.metadata);
  const owners = [getPhotoOwner(db, photoId), begun.success ? begun.data : null];
  return owners.every(
    (owner) => owner === null || (owner.shopId === member.shopId && owner.memberId === member.memberId),
  );
}

/** The file has come in: with the stand-in it lies in the incoming folder, from the hosted service it is fetched. */
async function complete(desk: Desk, ticket: UploadTicket, hosted: HostedFile & { name: string }) {
  const { db, root, config } = desk;
  const file = inUploads(root, incomingPath(ticket.photoId));
  const state = getPhoto(db, ticket.shopId, ticket.photoId)?.state;
  const isNew = state !== "processing" && state !== "ready";
  if (!config.isLocal && isNew) await fetchHosted(hosted, file);
  const verdict = await takeInPhoto(db, root, { ticket, fileName: hosted.name, file }, Date.now());
  if (!config.isLocal && isNew) await removeHosted(hosted, config.token);
  return { ...verdict };
}

function kitError(error: FaultError): UploadThingError {
  const { code } = error.fault;
  return new UploadThingError({
    code: code === "refused" || code === "signed-out" ? "FORBIDDEN" : "BAD_REQUEST",
    message: error.message,
    cause: error,
  });
}

/** What the phone gets when the kit refuses: our sentence as `detail`. */
function errorFormatter(error: UploadThingError): { message: string; detail: string; code: string } {
  const cause: unknown = error.cause;
  if (cause instanceof FaultError) return { message: cause.message, detail: cause.message, code: cause.fault.code };
  if (error.code === "BAD_REQUEST") {
    const detail = "The upload was not understood. Reload the page; your photos stay on this phone.";
    return { message: detail, detail, code: "invalid" };
  }
  console.error("upload", error);
  const detail = "The upload did not start: something broke on our side. It is tried again by itself.";
  return { message: detail, detail, code: "broken" };
}
