import { Fragment } from "react";
import type { ReactNode } from "react";

/** Long class names break after these, where a picture button on a phone is too narrow for them. */
const BREAKS_AFTER = /^(Under|Over|Immersion )(?=\S)/;

/** A class title that may break where the word has its joint. */
export function classWords(title: string): ReactNode {
  const start = BREAKS_AFTER.exec(title)?.[0];
  if (!start) return title;
  return (
    <Fragment>
      {start}
      <wbr />
      {title.slice(start.length)}
    </Fragment>
  );
}
