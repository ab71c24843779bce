"use client";

import { useEffect, useState } from "react";
import { Glyph } from "@/components/ui/glyph";
import { routes } from "@/lib/routes";
import styles from "./photos.module.css";
import type { SentPhoto } from "./photo-store";

interface PhotoCellProps {
  photo: SentPhoto;
  /** 1 for the first. */
  place: number;
  onRemove: (id: string) => void;
  onRetry: (id: string) => void;
}

/** One photo of a form: the picture, how far it is, and the ways to take it away or to send it again. */
export function PhotoCell({ photo, place, onRemove, onRetry }: PhotoCellProps) {
  const { id, state, words } = photo;
  const [picture, onBroken] = usePicture(photo);
  const caption = `${place} · ${stateWords(photo)}`;
  return (
    <li className={`shot ${place === 1 ? styles.first : ""}`}>
      {picture ? <img src={picture} alt={`Part, number ${place}`} onError={onBroken} /> : <NoPicture />}
      <span className="shot__cap">{caption}</span>
      {state === "waiting" && words && (
        <button
          type="button"
          className={styles.again}
          onClick={() => onRetry(id)}
          aria-label={`Send photo ${place} again`}
        >
          <Glyph name="ui-again" size={24} />
        </button>
      )}
      <button
        type="button"
        className={styles.away}
        onClick={() => onRemove(id)}
        aria-label={`Take photo ${place} away`}
      >
        <Glyph name="ui-cross" size={24} />
      </button>
    </li>
  );
}

function NoPicture() {
  return (
    <span className="shot__missing">
      <Glyph name="ui-part" size={30} />
    </span>
  );
}

function stateWords({ state, share, words }: SentPhoto): string {
  if (state === "sending") return share < 1 ? `${Math.floor(share * 100)}%` : "being checked";
  if (state === "waiting") return words ? "waits" : "next";
  return state === "sent" ? "sent" : "not kept";
}

const ASK_EVERY_MS = 1_500;
const ASK_MOST = 20;

/**
 * The picture in this browser; where it cannot draw that (HEIC), the server's thumbnail as soon as it stands.
 * @returns the address, or null as long as there is none, and what to call when it cannot be drawn
 */
function usePicture({ id, state, previewUrl }: SentPhoto): [string | null, () => void] {
  const [isBroken, setBroken] = useState(false);
  const [fromServer, setFromServer] = useState<string | null>(null);
  const needsServer = (isBroken || !previewUrl) && state === "sent" && !fromServer;

  useEffect(() => {
    if (!needsServer) return;
    let asked = 0;
    const ask = async () => {
      const answer = await fetch(`/api/photos/${id}`).catch(() => null);
      const body: unknown = answer?.ok ? await answer.json() : null;
      const isReady = typeof body === "object" && body !== null && "state" in body && body.state === "ready";
      if (isReady) setFromServer(routes.photo(id, "thumb"));
      if (isReady || ++asked >= ASK_MOST) clearInterval(timer);
    };
    const timer = setInterval(() => void ask(), ASK_EVERY_MS);
    return () => clearInterval(timer);
  }, [id, needsServer]);

  return [fromServer ?? (isBroken ? null : previewUrl), () => setBroken(true)];
}
