"use client";

import { useEffect, useId, useRef } from "react";
import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";

export interface DialogProps {
  open: boolean;
  onClose: () => void;
  title: string;
  /** wide: photos and long forms. sheet: stands at the foot of the screen on a phone. */
  size?: "plain" | "wide";
  children: ReactNode;
}

/** The browser's own modal: it keeps the focus, closes on Escape and gives the focus back. */
export function Dialog({ open, onClose, title, size = "plain", children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();

  useEffect(() => {
    if (open && !dialog.current?.open) dialog.current?.showModal();
    if (!open && dialog.current?.open) dialog.current.close();
  }, [open]);

  return (
    // A press on the backdrop lands on the dialog itself; the keyboard's way out is Escape, which the browser handles.
    // eslint-disable-next-line jsx-a11y/click-events-have-key-events, jsx-a11y/no-noninteractive-element-interactions
    <dialog
      ref={dialog}
      className={`dialog dialog--${size}`}
      aria-labelledby={titleId}
      onClose={onClose}
      onClick={(event) => {
        if (event.target === event.currentTarget) event.currentTarget.close();
      }}
    >
      <div className="dialog__in">
        <div className="dialog__head">
          <h2 id={titleId}>{title}</h2>
          <button type="button" className="icon-btn" aria-label="Close" onClick={() => dialog.current?.close()}>
            <Glyph name="ui-cross" />
          </button>
        </div>
        {children}
      </div>
    </dialog>
  );
}
