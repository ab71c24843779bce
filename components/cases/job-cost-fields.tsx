import { Field } from "@/components/ui/field";
import { fieldFault, typed, type ActState } from "@/lib/act-state";
import { JobLayerRows } from "./job-layer-rows";

/** The figures of a job as they stand in fields. */
export interface JobFigures {
  quantity: number;
  areaDm2: number;
  /** "42.50", or empty while nobody has filled it in. Only for those who may see money. */
  partValue?: string;
  finalStack: readonly { metal: string; thicknessUm: number }[];
}

export interface JobCostFieldsProps {
  state: ActState;
  /** What holds now; nothing for a new job. */
  figures?: JobFigures;
  /** "$" where the person may see money; null leaves the value out. */
  currencySign: string | null;
}

/** What the price of a case rests on: how many parts, their area, their value and their layers. */
export function JobCostFields({ state, figures, currencySign }: JobCostFieldsProps) {
  return (
    <>
      <div className="form__pair">
        <Field
          label="Parts in the job"
          name="quantity"
          required
          inputMode="numeric"
          defaultValue={typed(state, "quantity", figures?.quantity.toString())}
          error={fieldFault(state, "quantity")}
        />
        {currencySign !== null && (
          <Field
            label="Value of one part"
            name="partValue"
            optional
            unit={currencySign}
            inputMode="decimal"
            defaultValue={typed(state, "partValue", figures?.partValue)}
            error={fieldFault(state, "partValue")}
          />
        )}
      </div>
      <Field
        label="Plated area of one part"
        name="areaDm2"
        required
        unit="dm²"
        inputMode="decimal"
        hint="Length × width of all plated faces; 1 dm² is a hand's palm. A guess is better than none."
        defaultValue={typed(state, "areaDm2", figures?.areaDm2.toString())}
        error={fieldFault(state, "areaDm2")}
      />
      <JobLayerRows state={state} layers={figures?.finalStack} />
    </>
  );
}
