import { Caution } from "@/components/ui/caution";
import { Rests } from "@/components/ui/rests";
import type { WrittenStep } from "@/lib/cases/written-step";

/** One step: what can hurt comes first, then what to do. */
export function ReworkStep({ step }: { step: WrittenStep }) {
  const first = [...step.cautions].sort((a, b) => Number(b.level === "stop") - Number(a.level === "stop"));
  return (
    <>
      {first.length > 0 && (
        <div className="rw__cautions">
          {first.map((caution) => (
            <Caution key={caution.text} level={caution.level}>
              <b>{firstSentence(caution.text)}</b> {caution.text.slice(firstSentence(caution.text).length).trim()}
            </Caution>
          ))}
          <Rests>
            Read the solution&apos;s safety data sheet. Follow local codes and permits for air and waste water; where a
            licence is needed, its holder does the step.
          </Rests>
        </div>
      )}
      <h1 className="rw__step">{step.title}</h1>
      {step.detail && <p className="rw__how">{step.detail}</p>}
    </>
  );
}

/** "Acid. Gloves and face shield on." is read at a glance; the rest may take its time. */
function firstSentence(text: string): string {
  return /^.*?[.:](?=\s)/.exec(text)?.[0] ?? text;
}
