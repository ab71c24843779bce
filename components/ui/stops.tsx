import type { ChangeEvent, CSSProperties } from "react";
import { KeyCap, keyAttributes } from "@/components/ui/key-cap";
import { SURENESS, SURENESS_TITLES, type Sureness } from "@/lib/cases/case-words";

export interface StopsProps {
  name: string;
  legend?: string;
  hideLegend?: boolean;
  defaultValue?: Sureness;
  /** Null: none yet, and the component is controlled all the same. */
  value?: Sureness | null;
  onChange?: (event: ChangeEvent<HTMLInputElement>) => void;
  error?: string;
  /** The keys 1 to 3 set the notch, where nothing else on the screen wants them. */
  withKeys?: boolean;
}

/** How sure the caller is: three notches, each with a bar that fills. Native radios, values "1" to "3". */
export function Stops({
  name,
  legend = "How sure",
  hideLegend,
  defaultValue,
  value,
  onChange,
  error,
  withKeys,
}: StopsProps) {
  return (
    <fieldset className="picks-set">
      <legend className={hideLegend ? "sr-only" : undefined}>{legend}</legend>
      <div className="stops">
        {SURENESS.map((notch) => (
          <label className="stop" key={notch} style={{ "--n": notch } as CSSProperties}>
            <input
              className="pick__input"
              type="radio"
              name={name}
              value={notch}
              onChange={onChange}
              {...keyAttributes(withKeys ? String(notch) : undefined)}
              {...(value === undefined ? { defaultChecked: defaultValue === notch } : { checked: value === notch })}
            />
            {withKeys && <KeyCap>{String(notch)}</KeyCap>}
            {SURENESS_TITLES[notch]}
            <i aria-hidden="true" />
          </label>
        ))}
      </div>
      {error && <p className="field__error">{error}</p>}
    </fieldset>
  );
}
