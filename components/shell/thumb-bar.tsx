import type { ReactNode } from "react";
import { GO_TO_ID } from "@/components/shell/go-to-id";
import type { MainAction } from "@/components/shell/main-action";
import { Button, LinkButton } from "@/components/ui/button";
import { SubmitButton } from "@/components/ui/submit-button";

export interface ThumbBarProps {
  /** Where Back leads; null shows "Go to". */
  back: string | null;
  main?: MainAction | null;
  /** Instead of `main`: a Button of the screen's own. */
  children?: ReactNode;
}

/** Below 1080 px: one way out on the left, one main action under the thumb. */
export function ThumbBar({ back, main, children }: ThumbBarProps) {
  return (
    <section className="thumb" aria-label="Main action">
      {back ? (
        <LinkButton className="thumb__out" href={back} glyph="ui-back">
          Back
        </LinkButton>
      ) : (
        <Button className="thumb__out" glyph="ui-menu" popoverTarget={GO_TO_ID}>
          Go to
        </Button>
      )}
      {children}
      {!children && main && "href" in main && (
        <LinkButton variant="main" href={main.href} glyph={main.glyph}>
          {main.label}
        </LinkButton>
      )}
      {!children && main && "form" in main && (
        <SubmitButton variant="main" form={main.form} glyph={main.glyph}>
          {main.label}
        </SubmitButton>
      )}
    </section>
  );
}
