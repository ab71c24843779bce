"use client";

import { useSyncExternalStore } from "react";
import { Glyph } from "@/components/ui/glyph";

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

/** The bar in either state, for the gallery and for screens that know more about the signal. */
export function BusBar({ open, words }: { open: boolean; words?: string }) {
  return (
    <>
      <div className={open ? "busbar busbar--open" : "busbar"} aria-hidden="true" />
      <div role="status">
        {open && (
          <p className="offline">
            <Glyph name="ui-no-signal" />
            {words ?? "No signal. What is on this screen stays. Send it again when the signal is back."}
          </p>
        )}
      </div>
    </>
  );
}
