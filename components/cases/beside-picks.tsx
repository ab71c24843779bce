"use client";

import { useRouter } from "next/navigation";
import { createContext, useContext, useMemo, useOptimistic, useTransition } from "react";
import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";
import { besideAddress, MOST_BESIDE, toggleRef } from "@/lib/cases/beside";
import { routes } from "@/lib/routes";

/** The tray is this form: tick boxes anywhere on the page belong to it, so that it works without script. */
export const BESIDE_FORM = "beside";

interface Beside {
  refs: readonly string[];
  turn: (ref: string) => void;
  /** The casebook with this case taken out. */
  withoutHref: (ref: string) => string;
}

const BesideContext = createContext<Beside | null>(null);

export function useBeside(): Beside {
  const beside = useContext(BesideContext);
  if (!beside) throw new Error("Tick boxes for the tray stand inside BesideProvider.");
  return beside;
}

interface BesideProviderProps {
  /** As the address has them. */
  refs: readonly string[];
  /** The rest of the casebook's address. */
  address: Record<string, string>;
  children: ReactNode;
}

/** Keeps the picked cases in the address, so that turning a page or sending the link on loses none. */
export function BesideProvider({ refs, address, children }: BesideProviderProps) {
  const router = useRouter();
  const [shown, setShown] = useOptimistic<readonly string[]>(refs);
  const [, start] = useTransition();
  const beside = useMemo(() => {
    const hrefOf = (next: readonly string[]) => routes.casebook({ ...address, ...besideAddress(next) });
    return {
      refs: shown,
      withoutHref: (ref: string) => hrefOf(shown.filter((each) => each !== ref)),
      turn: (ref: string) =>
        start(() => {
          const next = toggleRef(shown, ref);
          setShown(next);
          router.replace(hrefOf(next), { scroll: false });
        }),
    };
  }, [shown, address, router, setShown]);
  return <BesideContext value={beside}>{children}</BesideContext>;
}

/** Sets a case beside the others; the fifth waits until one is taken out. */
export function BesideBox({ caseRef, hideWords }: { caseRef: string; hideWords?: boolean }) {
  const { refs, turn } = useBeside();
  const isIn = refs.includes(caseRef);
  return (
    <label className={isIn ? "beside is-in" : "beside"}>
      <input
        className="check__input"
        type="checkbox"
        name="refs"
        value={caseRef}
        form={BESIDE_FORM}
        checked={isIn}
        disabled={!isIn && refs.length >= MOST_BESIDE}
        onChange={() => turn(caseRef)}
      />
      <span className="check__box check__box--checkbox" aria-hidden="true">
        <Glyph name="ui-tick" />
      </span>
      <span className={hideWords ? "sr-only" : undefined}>
        Set beside <span className="sr-only">{caseRef}</span>
      </span>
    </label>
  );
}
