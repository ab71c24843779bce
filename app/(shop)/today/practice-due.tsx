import Link from "next/link";
import { Glyph } from "@/components/ui/glyph";
import { Section } from "@/components/ui/section";
import { routes } from "@/lib/routes";
import { practiseWords } from "@/lib/practice/practice-words";

/** One line: what practice has for this person today. Nothing at all when nothing waits. */
export function PracticeDue({ due, fresh, drills }: { due: number; fresh: number; drills: number }) {
  const words = practiseWords({ due, fresh, drills });
  if (words === null) return null;
  return (
    <Section title="Practice" aside={<Link href={routes.practiceProgress()}>Progress</Link>}>
      <p className="row">
        <Glyph name="station-inspect" size={32} />
        <Link className="solo" href={routes.practice()}>
          {words}
        </Link>
      </p>
    </Section>
  );
}
