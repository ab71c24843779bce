import type { ReactNode } from "react";

export interface EmptyProps {
  /** "The rack is clear". */
  title: string;
  /** One line: why, and what to do. */
  children?: ReactNode;
  /** A LinkButton, where there is one thing to do. */
  action?: ReactNode;
  level?: 2 | 3;
}

/** Nothing here: the outline of a tag that does not hang. */
export function Empty({ title, children, action, level = 3 }: EmptyProps) {
  const Heading = level === 2 ? "h2" : "h3";
  return (
    <div className="empty">
      <Heading className="empty__title">{title}</Heading>
      {children && <p>{children}</p>}
      {action && <div className="empty__action">{action}</div>}
    </div>
  );
}
