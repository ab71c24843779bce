"use client";

import { Button } from "@/components/ui/button";

/** Opens the browser's print dialog. */
export function PrintButton({ children }: { children: string }) {
  return (
    <Button variant="main" glyph="ui-print" keyCap="P" onClick={() => window.print()}>
      {children}
    </Button>
  );
}
