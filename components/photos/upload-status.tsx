"use client";

import { useEffect, useSyncExternalStore } from "react";
import { Button } from "@/components/ui/button";
import { Note } from "@/components/ui/note";
import { startSending, takeAway } from "./photo-queue";
import { photoStore, type SentPhoto } from "./photo-store";
import styles from "./photos.module.css";

/** In every page of the shop: photos that an earlier page left go on going up, and it shows. */
export function UploadStatus({ memberId }: { memberId: number }) {
  const shelf = useSyncExternalStore(photoStore.subscribe, photoStore.get, photoStore.getOnServer);
  useEffect(() => void startSending(memberId), [memberId]);

  // A form says itself what becomes of its photos.
  const photos = [...shelf.photos.values()].filter(
    (photo) => photo.memberId === memberId && !shelf.shown.has(photo.id),
  );
  const going = photos.filter((photo) => photo.state === "waiting" || photo.state === "sending");
  const refused = photos.filter((photo) => photo.state === "refused");
  return (
    <aside className={styles.status} aria-label="Photos on their way">
      {/* Always there, so that a screen reader hears what comes into it. */}
      <p role="status" className={styles.going}>
        {going.length > 0 && goingWords(going)}
      </p>
      {refused.map(({ id, words }) => (
        <Note key={id} tone="rust" title="A photo was not kept" role="alert">
          {words}
          <span className={styles.ways}>
            <Button onClick={() => takeAway(id)}>Understood</Button>
          </span>
        </Note>
      ))}
    </aside>
  );
}

/** @example "2 photos still going up" */
export function goingWords(going: readonly Pick<SentPhoto, "state" | "words">[]): string {
  const photos = going.length === 1 ? "1 photo" : `${going.length} photos`;
  const stuck = going.every((photo) => photo.state === "waiting") ? going.find((photo) => photo.words)?.words : null;
  return stuck ? `${photos} still on this phone. ${stuck}` : `${photos} still going up`;
}
