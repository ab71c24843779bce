/** Something is being worked out: a tank that fills. No spinner. */
export function ReadingTank({ title, children }: { title: string; children?: string }) {
  return (
    <div className="reading-tank" role="status">
      <span className="wait" aria-hidden="true" />
      <span>
        <strong>{title}</strong>
        {children && <small>{children}</small>}
      </span>
    </div>
  );
}
