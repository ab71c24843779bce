import Link from "next/link";
import { DataTable, type Column } from "@/components/ui/data-table";

/** A job as its list shows it. */
export interface JobView {
  id: number;
  number: string;
  customer: string;
  partName: string;
  metal: string;
  quantity: number;
  layers: string;
  /** "1 on hold"; empty where none is. */
  held: string;
  /** "$42.00", "not set"; undefined for those who may not see money. */
  value?: string;
  /** Where a senior changes it; undefined for the others. */
  changeHref?: string;
}

export interface JobTableProps {
  caption: string;
  jobs: readonly JobView[];
  /** "Change", or "Open again" among the closed. */
  changeWords: string;
  /** Only what tells jobs apart, beside a form. */
  brief?: boolean;
}

/** Jobs, one a row. */
export function JobTable({ caption, jobs, changeWords, brief }: JobTableProps) {
  const hasValue = jobs.some((job) => job.value !== undefined);
  const hasChange = jobs.some((job) => job.changeHref);
  const names: Column<JobView>[] = [
    { key: "number", head: "Job", cell: (job) => <strong className="wrap-anywhere">{job.number}</strong> },
    { key: "customer", head: "Customer", cell: (job) => <span className="wrap-anywhere">{job.customer}</span> },
    { key: "part", head: "Part", cell: (job) => <span className="wrap-anywhere">{job.partName}</span> },
  ];
  const facts: Column<JobView>[] = [
    { key: "metal", head: "Base metal", cell: (job) => job.metal },
    { key: "quantity", head: "Parts", numeric: true, cell: (job) => job.quantity },
    { key: "layers", head: "On the strike", cell: (job) => job.layers },
    ...(hasValue ? [{ key: "value", head: "Value of a part", numeric: true, cell: (job: JobView) => job.value }] : []),
    { key: "held", head: "Cases", cell: (job) => job.held },
    ...(hasChange ? [{ key: "change", head: changeWords, cell: (job: JobView) => changeLink(job, changeWords) }] : []),
  ];
  return (
    <DataTable
      caption={caption}
      columns={brief ? names : [...names, ...facts]}
      rows={jobs}
      rowKey={(job) => String(job.id)}
    />
  );
}

function changeLink(job: JobView, words: string) {
  if (!job.changeHref) return null;
  return (
    <Link href={job.changeHref}>
      {words}
      <span className="sr-only"> {job.number}</span>
    </Link>
  );
}
