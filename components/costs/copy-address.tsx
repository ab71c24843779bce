"use client";

import { useEffect, useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { say } from "@/components/ui/toast";

/** Copies the page's address, which holds everything that was typed. Where the browser forbids it, shows it to copy by hand. */
export function CopyAddress() {
  const [byHand, setByHand] = useState<string | null>(null);
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (byHand === null) return;
    box.current?.querySelector("input")?.select();
  }, [byHand]);
  const copy = async () => {
    const address = window.location.href;
    try {
      await navigator.clipboard.writeText(address);
      say("Address copied. Who opens it sees this batch.");
    } catch {
      // No clipboard outside a secure connection, or the person said no.
      setByHand(address);
    }
  };
  return (
    <>
      <Button onClick={() => void copy()}>Copy the address</Button>
      {byHand !== null && (
        <div ref={box} className="est-address">
          <Field
            label="Copy it from here"
            name="address"
            readOnly
            value={byHand}
            onFocus={(event) => event.target.select()}
          />
        </div>
      )}
    </>
  );
}
