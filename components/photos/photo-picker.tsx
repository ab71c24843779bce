"use client";

import { useEffect, useEffectEvent, useRef, type ChangeEvent } from "react";
import { useDropzone } from "react-dropzone";
import { Button } from "@/components/ui/button";
import { Fill } from "@/components/ui/fill";
import { Glyph } from "@/components/ui/glyph";
import { Note } from "@/components/ui/note";
import type { PhotoPurpose } from "@/lib/photos/photo-words";
import { PhotoCell } from "./photo-cell";
import styles from "./photos.module.css";
import type { SendState, SentPhoto } from "./photo-store";
import { usePhotoUploads } from "./use-photo-uploads";

export interface PickedPhoto {
  id: string;
  state: SendState;
  /** Why it waits or is not kept. */
  words: string | null;
}

export interface PhotoPickerProps {
  purpose: PhotoPurpose;
  /** How many photos there may be. */
  max: number;
  /** Who is signed in: only their photos are sent. */
  memberId: number;
  /** Numbers of photos that were taken before; read once. */
  existing?: readonly string[];
  /** Told at each change of a photo's state, not of its progress. */
  onChange?: (photos: PickedPhoto[]) => void;
  /** Name of hidden inputs that carry the numbers of all photos that are not refused. */
  name?: string;
}

const ACCEPT = "image/*,.heic,.heif";

/** Photos by camera, by file and by dropping them here. They go up behind the form and past its end. */
export function PhotoPicker({ onChange, name, ...options }: PhotoPickerProps) {
  const { photos, room, add, remove, retry } = usePhotoUploads(options);
  const camera = useRef<HTMLInputElement>(null);
  const drop = useDropzone({ onDrop: add, noClick: true, noKeyboard: true, disabled: room === 0 });
  useStateChanges(photos, onChange);

  const openCamera = () => camera.current?.click();
  const takePicked = (event: ChangeEvent<HTMLInputElement>) => {
    add([...(event.target.files ?? [])]);
    // The same file chosen again would say nothing without this.
    event.target.value = "";
  };
  const retake = (id: string) => {
    remove(id);
    openCamera();
  };
  const dropClass = drop.isDragActive ? `${styles.picker} ${styles.isOver}` : styles.picker;
  return (
    <div {...drop.getRootProps({ className: dropClass, role: "group", tabIndex: undefined })} aria-label="Photos">
      <input
        ref={camera}
        type="file"
        accept="image/*"
        capture="environment"
        hidden
        aria-label="Photo from the camera"
        onChange={takePicked}
      />
      <input {...drop.getInputProps({ accept: ACCEPT, multiple: true, hidden: true, "aria-label": "Photo files" })} />
      <ul className={styles.roll}>
        {photos.map((photo, index) => (
          <PhotoCell key={photo.id} photo={photo} place={index + 1} onRemove={remove} onRetry={retry} />
        ))}
        {room > 0 && (
          <li className={photos.length === 0 ? styles.first : undefined}>
            <button type="button" className={styles.add} onClick={openCamera}>
              <Glyph name="ui-camera" size={30} />
              <span>{addWords(photos.length, room)}</span>
            </button>
          </li>
        )}
      </ul>
      {room > 0 && (
        <Button variant="quiet" glyph="ui-plus" onClick={drop.open}>
          Choose from files
        </Button>
      )}
      <Going photos={photos} />
      <RefusedPhotos photos={photos} onRetake={retake} onRemove={remove} />
      {name && kept(photos).map(({ id }) => <input key={id} type="hidden" name={name} value={id} />)}
    </div>
  );
}

function addWords(taken: number, room: number): string {
  if (taken === 0) return "Take a photo";
  return room === 1 ? "Add 1 more" : `Add 1 to ${room} more`;
}

function kept(photos: readonly SentPhoto[]): SentPhoto[] {
  return photos.filter((photo) => photo.state !== "refused");
}

function Going({ photos }: { photos: readonly SentPhoto[] }) {
  const all = kept(photos);
  if (all.every((photo) => photo.state === "sent")) return null;
  const waits = all.find((photo) => photo.state === "waiting" && photo.words);
  const share = all.reduce((sum, photo) => sum + photo.share, 0) / all.length;
  return <Fill label={waits?.words ?? "Sending. Carry on."} share={share} />;
}

interface RefusedPhotosProps {
  photos: readonly SentPhoto[];
  onRetake: (id: string) => void;
  onRemove: (id: string) => void;
}

function RefusedPhotos({ photos, onRetake, onRemove }: RefusedPhotosProps) {
  return photos.map(
    ({ id, state, words }, index) =>
      state === "refused" && (
        <Note key={id} tone="rust" title={`Photo ${index + 1} is not kept`} role="alert">
          {words}
          <span className={styles.ways}>
            <Button glyph="ui-camera" onClick={() => onRetake(id)}>{`Take photo ${index + 1} again`}</Button>
            <Button variant="quiet" onClick={() => onRemove(id)}>
              Take it away
            </Button>
          </span>
        </Note>
      ),
  );
}

/** Tells the form when a photo comes, goes or changes its state; a form that listened to each percent would flicker. */
function useStateChanges(photos: readonly SentPhoto[], onChange: PhotoPickerProps["onChange"]): void {
  const tell = useEffectEvent(() => onChange?.(photos.map(({ id, state, words }) => ({ id, state, words }))));
  const signature = photos.map(({ id, state, words }) => `${id} ${state} ${words ?? ""}`).join("\n");
  useEffect(() => tell(), [signature]);
}
