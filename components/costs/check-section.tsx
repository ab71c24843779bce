import { TestPieces } from "@/components/costs/test-pieces";
import { WorthTry } from "@/components/costs/worth-try";
import { Section } from "@/components/ui/section";
import type { TypedTestPieces } from "@/lib/costs/test-piece-words";

export interface CheckSectionProps {
  worth: {
    inspected: number;
    bad: number;
    runs: number;
    labourCentsPerHour: number;
    missCents: number | null;
    missFrom: string;
    testPieces: TypedTestPieces;
    testPiecesRest: string;
  };
  /** "in the last 30 days". */
  periodWords: string;
  currency: string;
}

/** On the owner's page: is looking at every strike worth it, and would a test piece first be. */
export function CheckSection({ worth, periodWords, currency }: CheckSectionProps) {
  const { missCents, testPieces, testPiecesRest, ...figures } = worth;
  return (
    <div className="ledger-check">
      <Section title="Is looking at every strike worth it" aside="All stations">
        {missCents === null ? (
          <p>
            Nothing was struck {periodWords}, and fewer than eight cases say what a miss costs. Choose a longer time, or
            log the runs.
          </p>
        ) : (
          <WorthTry {...figures} missCents={missCents} periodWords={periodWords} currency={currency} />
        )}
      </Section>
      <Section title="A test piece first" aside="Before a run">
        {/* The key: another time begins with other figures. */}
        <TestPieces
          key={Object.values(testPieces).join()}
          start={testPieces}
          currency={currency}
          rests={testPiecesRest}
        />
      </Section>
    </div>
  );
}
