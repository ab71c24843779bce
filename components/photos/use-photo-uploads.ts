"use client";

import { useEffect, useSyncExternalStore } from "react";
import type { PhotoPurpose } from "@/lib/photos/photo-words";
import { loadKit } from "./photo-line";
import { addPhoto, retryPhoto, startSending, takeAway } from "./photo-queue";
import { photoStore, showPhotos, type SentPhoto } from "./photo-store";
import { usePickedIds } from "./use-picked-ids";

interface PhotoUploadsOptions {
  purpose: PhotoPurpose;
  /** Who is signed in: only their photos are sent. */
  memberId: number;
  /** How many photos there may be. */
  max: number;
  /** Numbers of photos that were taken before, here or on another page. */
  existing?: readonly string[];
}

export interface PhotoUploads {
  photos: SentPhoto[];
  /** How many more may be added. */
  room: number;
  add: (files: readonly File[]) => void;
  remove: (id: string) => void;
  retry: (id: string) => void;
}

/** The photos of one form, and their way to the server, which goes on when the form is left. */
export function usePhotoUploads({ purpose, memberId, max, existing = [] }: PhotoUploadsOptions): PhotoUploads {
  const [ids, setIds] = usePickedIds(`${memberId}:${purpose}`, existing);
  const shelf = useSyncExternalStore(photoStore.subscribe, photoStore.get, photoStore.getOnServer);

  useEffect(() => {
    void startSending(memberId);
    // Tried again at the first photo, should it fail here.
    loadKit().catch(() => undefined);
  }, [memberId]);
  useEffect(() => showPhotos(ids), [ids]);

  const photos = ids.map((id): SentPhoto => {
    const known = shelf.photos.get(id);
    // What this browser no longer holds, it has sent.
    const state = shelf.isRead ? "sent" : "waiting";
    return known ?? { id, memberId, purpose, state, share: 1, words: null, previewUrl: null };
  });
  const room = Math.max(0, max - photos.length);
  return {
    photos,
    room,
    add: (files) => {
      const added = files.slice(0, room).map((file) => addPhoto(file, { purpose, memberId }));
      setIds((before) => [...before, ...added]);
    },
    remove: (id) => {
      takeAway(id);
      setIds((before) => before.filter((each) => each !== id));
    },
    retry: retryPhoto,
  };
}
