"use client";

import { ThumbBar } from "@/components/shell/thumb-bar";
import { Button, LinkButton } from "@/components/ui/button";
import type { GlyphName } from "@/components/ui/glyph-names";
import { routes } from "@/lib/routes";

/** What the person does next. */
export type NextStep =
  | { kind: "ask" }
  | { kind: "choose-job"; onPress: () => void }
  | { kind: "keep"; label: string; isBusy: boolean }
  | { kind: "hold" }
  | { kind: "weigh-another"; onPress: () => void };

export const CHECK_FORM = "check";
export const KEEP_FORM = "keep";

/** The one main action of the check: under the thumb on a phone, under the verdict on a wide screen. */
export function CheckMain({ step, back }: { step: NextStep; back: string | null }) {
  return (
    <ThumbBar back={back}>
      <MainButton step={step} />
    </ThumbBar>
  );
}

/** The same button as it stands on a wide screen. */
export function MainButton({ step, className }: { step: NextStep; className?: string }) {
  const look = (glyph: GlyphName) => ({ variant: "main" as const, glyph, className });
  switch (step.kind) {
    case "ask":
      return (
        <Button {...look("ui-part")} type="submit" form={CHECK_FORM}>
          See what fits
        </Button>
      );
    case "choose-job":
      return (
        <Button {...look("ui-part")} onClick={step.onPress}>
          Choose its job
        </Button>
      );
    case "keep":
      return (
        <Button {...look("ui-tick")} type="submit" form={KEEP_FORM} busy={step.isBusy}>
          {step.label}
        </Button>
      );
    case "hold":
      return (
        <LinkButton {...look("ui-camera")} href={routes.snap()}>
          Snap the part
        </LinkButton>
      );
    case "weigh-another":
      return (
        <Button {...look("ui-part")} onClick={step.onPress}>
          Weigh another part
        </Button>
      );
  }
}
