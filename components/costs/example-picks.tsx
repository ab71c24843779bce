import { SelectField } from "@/components/ui/field";
import { PickGroup, type PickOption } from "@/components/ui/pick";
import type { NamedExample } from "@/lib/costs/rates-bench";

/** Which rework the rates are tried on: the dearest case, the usual job, or a closed case by its reference. */
export function ExamplePicks({
  examples,
  chosen,
  onChoose,
}: {
  examples: readonly NamedExample[];
  chosen: NamedExample;
  onChoose: (id: string) => void;
}) {
  const closed = examples.filter(({ kind }) => kind === "case");
  const options: PickOption[] = examples
    .filter(({ kind }) => kind !== "case")
    .map((each) => ({
      value: each.id,
      label: each.title,
      hint: each.kind === "dearest" ? `dearest, ${each.note}` : each.note,
    }));
  const [newest] = closed;
  if (newest) {
    const value = chosen.kind === "case" ? chosen.id : newest.id;
    options.push({ value, label: "Another closed case", hint: `the ${closed.length} newest` });
  }
  return (
    <>
      <PickGroup
        legend="Example"
        hideLegend
        kind="radio"
        name="example"
        layout="rows"
        options={options}
        value={chosen.id}
        onChange={(event) => onChoose(event.target.value)}
      />
      {chosen.kind === "case" && (
        <SelectField
          label="Case"
          name="exampleCase"
          value={chosen.id}
          onChange={(event) => onChoose(event.target.value)}
          options={closed.map((each) => ({ value: each.id, label: `${each.ref}: ${each.title}, ${each.note}` }))}
        />
      )}
    </>
  );
}
