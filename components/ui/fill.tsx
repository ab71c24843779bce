export interface FillProps {
  /** What is going on: "Sending. Carry on." */
  label: string;
  /** 0 to 1. */
  share: number;
}

/** A measure that fills like a tank. */
export function Fill({ label, share }: FillProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100);
  return (
    <div className="fill-block">
      <span>{label}</span>
      <span className="fig">{percent}%</span>
      <span
        className="fill"
        role="progressbar"
        aria-label={label}
        aria-valuenow={percent}
        aria-valuemin={0}
        aria-valuemax={100}
      >
        <i style={{ width: `${percent}%` }} />
      </span>
    </div>
  );
}
