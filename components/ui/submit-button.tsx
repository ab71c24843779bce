"use client";

import { useFormStatus } from "react-dom";
import { Button, type ButtonProps } from "@/components/ui/button";

/** Submits the form around it and shows by itself that the form is on its way. */
export function SubmitButton({ busy, ...props }: Omit<ButtonProps, "type">) {
  const { pending } = useFormStatus();
  return <Button {...props} type="submit" busy={busy ?? pending} />;
}
