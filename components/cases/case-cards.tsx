import { Caution } from "@/components/ui/caution";
import { DataTable } from "@/components/ui/data-table";
import { OUTCOME_TITLES, type Outcome } from "@/lib/cases/case-words";
import { cardProgress } from "@/lib/cases/card-progress";
import { counted } from "@/lib/cases/part-words";

interface CardStep {
  position: number;
  title: string;
  plannedMinutes: number;
  spentMinutes: number | null;
  cautions: readonly { level: "caution" | "stop"; text: string }[];
  tickedAt: number | null;
  tickedBy: string | null;
}

export interface CardView {
  id: number;
  round: number;
  title: string;
  outcome: Outcome | null;
  outcomeNote: string;
  steps: readonly CardStep[];
}

/** One round's card: what it planned, what it took, who did it. */
function Card({ card }: { card: CardView }) {
  const progress = cardProgress(card.steps.map((step) => ({ id: step.position, ...step })));
  return (
    <div className="round-card keeps-table">
      <h3>
        Round {card.round}. {card.title}
      </h3>
      <DataTable
        caption={`Steps of round ${card.round}, minutes planned and taken`}
        rows={card.steps}
        rowKey={(step) => String(step.position)}
        columns={[
          { key: "step", head: "Step", cell: (step) => <StepCell step={step} /> },
          { key: "card", head: "Card", numeric: true, cell: (step) => step.plannedMinutes },
          { key: "took", head: "Took", numeric: true, cell: (step) => step.spentMinutes ?? "open" },
        ]}
        foot={[`${progress.ticked} of ${progress.steps} ticked`, progress.plannedMinutes, progress.spentMinutes]}
      />
      {card.outcome && (
        <p className="small">
          <b className={card.outcome === "sound" ? "good" : "bad"}>
            Re-strike: {OUTCOME_TITLES[card.outcome].toLowerCase()}.
          </b>{" "}
          {card.outcomeNote}
        </p>
      )}
    </div>
  );
}

/** A step and its cautions: this card is a record, so they are folded, but they stand beside their step here too. */
function StepCell({ step }: { step: CardStep }) {
  return (
    <>
      {step.title}
      {step.tickedBy && <small className="step-who">{step.tickedBy}</small>}
      {step.cautions.length > 0 && (
        <details className="card-cautions">
          <summary>{counted(step.cautions.length, "caution")}</summary>
          {step.cautions.map((caution) => (
            <Caution key={caution.text} level={caution.level}>
              {caution.text}
            </Caution>
          ))}
        </details>
      )}
    </>
  );
}

export function CaseCards({ cards }: { cards: readonly CardView[] }) {
  return cards.map((card) => <Card key={card.id} card={card} />);
}
