"use client";

import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import { SubmitButton } from "@/components/ui/submit-button";

interface WithdrawDrillProps {
  drillId: number;
  title: string;
  onWithdraw: FormAct<{ id: number }>;
}

/** Takes a drill back. What was called in it stays. */
export function WithdrawDrill({ drillId, title, onWithdraw }: WithdrawDrillProps) {
  const { state, isBusy, form } = useSend(onWithdraw);
  return (
    <form {...form}>
      <FaultNote state={state} title="Not withdrawn" />
      <input type="hidden" name="drillId" value={drillId} />
      <SubmitButton variant="hold" busy={isBusy} aria-label={`Withdraw ${title}`}>
        Withdraw
      </SubmitButton>
    </form>
  );
}
