import Link from "next/link";
import { useId } from "react";
import type { ComponentPropsWithoutRef, ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";
import type { GlyphName } from "@/components/ui/glyph-names";
import { KeyCap, keyAttributes } from "@/components/ui/key-cap";

/** main: copper, once a screen. plain: the rest. hold: keeps a part back or ends it. quiet: words only. */
export type ButtonVariant = "main" | "plain" | "hold" | "quiet";

interface ButtonLook {
  variant?: ButtonVariant;
  glyph?: GlyphName;
  /** Shown at the end; the shell's key listener presses the button on that key. */
  keyCap?: string;
  /** Takes the whole width. */
  wide?: boolean;
}

export interface ButtonProps extends ButtonLook, ComponentPropsWithoutRef<"button"> {
  /** The work is under way: the label stays, a tank fills, a second press does nothing. */
  busy?: boolean;
  /** Disables the button and says why, beside it. */
  disabledReason?: string;
}

export interface LinkButtonProps extends ButtonLook, Omit<ComponentPropsWithoutRef<typeof Link>, "href"> {
  href: string;
}

function lookClass({ variant = "plain", wide }: ButtonLook, extra: string | undefined): string {
  return ["btn", `btn--${variant}`, wide && "btn--wide", extra].filter(Boolean).join(" ");
}

function Inside({ glyph, keyCap, busy, children }: ButtonLook & { busy?: boolean; children?: ReactNode }) {
  return (
    <>
      {busy ? <span className="btn__tank" aria-hidden="true" /> : glyph && <Glyph name={glyph} />}
      <span className="btn__label">{children}</span>
      {keyCap && <KeyCap>{keyCap}</KeyCap>}
    </>
  );
}

/** A button. Give it `busy` while its work runs, and `disabledReason` instead of a bare `disabled`. */
export function Button(props: ButtonProps) {
  const { variant, glyph, keyCap, wide, busy, disabledReason, children, className, ...native } = props;
  const reasonId = useId();
  // While busy the button neither submits nor runs its handler, but it keeps the focus: a disabled one would lose it.
  const busyProps = busy
    ? { type: "button" as const, onClick: undefined, "aria-disabled": true, "aria-busy": true }
    : {};
  const button = (
    <button
      type="button"
      {...native}
      {...busyProps}
      {...keyAttributes(keyCap)}
      disabled={native.disabled || disabledReason !== undefined}
      aria-describedby={disabledReason ? reasonId : native["aria-describedby"]}
      className={lookClass({ variant, wide }, className)}
    >
      <Inside glyph={glyph} keyCap={keyCap} busy={busy}>
        {children}
      </Inside>
    </button>
  );
  if (!disabledReason) return button;
  return (
    <span className="btn-why">
      {button}
      <span id={reasonId}>{disabledReason}</span>
    </span>
  );
}

/** A link that looks like a button: it goes somewhere, it changes nothing. */
export function LinkButton(props: LinkButtonProps) {
  const { variant, glyph, keyCap, wide, children, className, ...native } = props;
  return (
    <Link {...native} {...keyAttributes(keyCap)} className={lookClass({ variant, wide }, className)}>
      <Inside glyph={glyph} keyCap={keyCap}>
        {children}
      </Inside>
    </Link>
  );
}
