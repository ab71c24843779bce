import { Caution } from "@/components/ui/caution";
import type { SecondLookOffer } from "@/lib/cases/second-look-form";

/** A step's cautions stand beside it, whatever is changed in its words. */
export function StepCautions({ keys, cautions }: { keys: readonly string[]; cautions: SecondLookOffer["cautions"] }) {
  return keys.map((key) => {
    const caution = cautions[key];
    return caution ? (
      <Caution key={key} level={caution.level}>
        {caution.text}
      </Caution>
    ) : null;
  });
}
