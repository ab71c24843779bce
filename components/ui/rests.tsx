import type { ReactNode } from "react";

/** What the figure above rests on: how many cases, which rates, recorded or an estimate. */
export function Rests({ children }: { children: ReactNode }) {
  return <p className="rests">{children}</p>;
}
