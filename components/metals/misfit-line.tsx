import Link from "next/link";
import { Glyph } from "@/components/ui/glyph";
import { Note } from "@/components/ui/note";
import type { Misfit } from "@/lib/metals/misfit";

/** The warning on one line, in a list of jobs. */
export function MisfitLine({ misfit }: { misfit: Misfit }) {
  return (
    <p className="misfit">
      <Glyph name="ui-stop" size={24} label="Warning" />
      <span>
        <strong>{misfit.words}</strong> {misfit.who}{" "}
        <Link className="misfit__way" href={misfit.href}>
          See the weighing
        </Link>
      </span>
    </p>
  );
}

/** The warning at the top of a case of that job. */
export function MisfitNote({ misfit }: { misfit: Misfit }) {
  return (
    <Note tone="rust" title="The metal does not fit the job" className="case-note">
      {misfit.words} {misfit.who}{" "}
      <Link className="misfit__way" href={misfit.href}>
        See the weighing
      </Link>
    </Note>
  );
}
