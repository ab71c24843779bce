"use client";

import { useSyncExternalStore } from "react";

function subscribe(changed: () => void): () => void {
  window.addEventListener("online", changed);
  window.addEventListener("offline", changed);
  return () => {
    window.removeEventListener("online", changed);
    window.removeEventListener("offline", changed);
  };
}

/** The bus bar. It opens when the signal goes, and says what that means. */
export function OfflineBar() {
  const online = useSyncExternalStore(
    subscribe,
    () => navigator.onLine,
    () => true,
  );
  return <BusBar open={!online} />;
}

/** Drawn here and not taken from the sprite: it must show when the sprite cannot be fetched. */
function NoSignal() {
  return (
    <svg className="g" viewBox="0 0 24 24" fill="none" aria-hidden="true">
      <path
        stroke="currentColor"
        strokeWidth="1.9"
        strokeLinecap="round"
        strokeLinejoin="round"
        d="M3.5 9.6C5 8.2 6.7 7.1 8.6 6.5M20.5 9.6C18.2 7.4 15.2 6.1 12 6M7 13.3C7.9 12.5 8.9 11.9 10 11.5M17 13.3C16.3 12.6 15.5 12.1 14.6 11.7M4 3.5L20 20.5"
      />
      <circle cx="12" cy="17.6" r="1.7" fill="currentColor" />
    </svg>
  );
}

/** The bar in either state, for the gallery and for screens that know more about the signal. */
export function BusBar({ open, words }: { open: boolean; words?: string }) {
  return (
    <>
      <div className={open ? "busbar busbar--open" : "busbar"} aria-hidden="true" />
      <div role="status">
        {open && (
          <p className="offline">
            <NoSignal />
            {words ?? "No signal. What is on this screen stays. Snaps and photos go up by themselves when it is back."}
          </p>
        )}
      </div>
    </>
  );
}
