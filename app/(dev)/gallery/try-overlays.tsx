"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { say } from "@/components/ui/toast";

/** Opens what only exists while it is open. */
export function TryOverlays() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Open a dialog</Button>
      <Button onClick={() => say("Off hold. Case closed.")}>Say an outcome</Button>
      <Dialog open={open} onClose={() => setOpen(false)} title="Take the part off hold">
        <p>It goes on to the final plate. The history keeps who said so.</p>
        <div className="btns mt-4">
          <Button variant="main" onClick={() => setOpen(false)}>
            Release it
          </Button>
          <Button variant="quiet" onClick={() => setOpen(false)}>
            Leave it held
          </Button>
        </div>
      </Dialog>
    </>
  );
}
