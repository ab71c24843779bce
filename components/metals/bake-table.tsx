import { Slip } from "@/components/ui/slip";
import type { BakeStep } from "@/lib/metals/pretreatment/bake";

/** Least hours in the oven by tensile strength, the weakest first. */
export function BakeTable({ steps }: { steps: readonly BakeStep[] }) {
  return (
    <Slip
      rows={steps.map((step) => ({
        label: `${step.overMPa + 1} to ${step.toMPa} MPa`,
        value: `${step.hours} h at least`,
      }))}
    />
  );
}
