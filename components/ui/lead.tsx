import type { ReactNode } from "react";
import { LinkButton } from "@/components/ui/button";
import type { MainAction } from "@/components/shell/main-action";

export interface LeadProps {
  /** The sentence the page opens with: "Two parts need your hands". */
  children: ReactNode;
  /** Small line above it: day, shift, run. */
  above?: ReactNode;
  /** Plain line under it. */
  below?: ReactNode;
  /** page: a calmer title, for work screens. */
  size?: "lead" | "page";
  /** The screen's main action; here from 1080 px up, below that it is in the thumb bar. */
  main?: MainAction | null;
}

/** A page opens with a sentence, not with a row of figures. */
export function Lead({ children, above, below, size = "lead", main }: LeadProps) {
  return (
    <header className="lead-block">
      {above && <div className="lead-block__above">{above}</div>}
      <h1 className={size === "lead" ? "lead" : undefined}>{children}</h1>
      {below && <p className="lead-block__below">{below}</p>}
      {main && "href" in main && (
        <LinkButton className="desk-only" variant="main" href={main.href} glyph={main.glyph} keyCap={main.keyCap}>
          {main.label}
        </LinkButton>
      )}
    </header>
  );
}
