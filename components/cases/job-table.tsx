import Link from "next/link";
import { MisfitLine } from "@/components/metals/misfit-line";
import { DataTable, type Column } from "@/components/ui/data-table";
import type { Misfit } from "@/lib/metals/misfit";

/** A job as its list shows it. */
export interface JobView {
  id: number;
  number: string;
  customer: string;
  partName: string;
  metal: string;
  quantity: number;
  layers: string;
  /** How many of its cases hang on hold; empty where none does. */
  held: string;
  /** "$42.00", "not set"; undefined for those who may not see money. */
  value?: string;
  /** Where a part of it is weighed. */
  weighHref: string;
  /** Where taking its layers off is worked out; undefined for those who may not see money. */
  stripHref?: string;
  /** A part of it weighed unlike what it declares: in words, who and when, and the way to that weighing. */
  misfit?: Misfit;
  /** Where a senior changes it; undefined for the others. */
  changeHref?: string;
}

export interface JobTableProps {
  caption: string;
  jobs: readonly JobView[];
  /** Only what tells jobs apart, beside a form. */
  brief?: boolean;
}

const NAMES: readonly Column<JobView>[] = [
  { key: "number", head: "Job", cell: (job) => <JobNumber job={job} /> },
  { key: "customer", head: "Customer", cell: (job) => <span className="wrap-anywhere">{job.customer}</span> },
  { key: "part", head: "Part", cell: (job) => <span className="wrap-anywhere">{job.partName}</span> },
];
const FACTS: readonly Column<JobView>[] = [
  { key: "metal", head: "Base metal", cell: (job) => <span className="wrap-anywhere">{job.metal}</span> },
  { key: "layers", head: "On the strike", cell: (job) => <JobLayers job={job} /> },
  { key: "quantity", head: "Parts", numeric: true, cell: (job) => job.quantity },
];
const VALUE: Column<JobView> = { key: "value", head: "Value of a part", numeric: true, cell: (job) => job.value };
const HELD: Column<JobView> = { key: "held", head: "Cases on hold", numeric: true, cell: (job) => job.held };

const WEIGH: Column<JobView> = {
  key: "weigh",
  head: "Metal check",
  cell: (job) => (
    <Link href={job.weighHref} aria-label={`Weigh a part of ${job.number}`}>
      Weigh a part
    </Link>
  ),
};

/** Jobs, one a row. */
export function JobTable({ caption, jobs, brief }: JobTableProps) {
  const hasValue = jobs.some((job) => job.value !== undefined);
  const all = [...NAMES, ...FACTS, ...(hasValue ? [VALUE] : []), HELD, WEIGH];
  return (
    <DataTable
      caption={caption}
      columns={brief ? NAMES : all}
      rows={jobs}
      rowKey={(job) => String(job.id)}
      rowNote={brief ? undefined : (job) => job.misfit && <MisfitLine misfit={job.misfit} />}
    />
  );
}

/** For those who may change the job its number is the way there. */
function JobNumber({ job }: { job: JobView }) {
  if (!job.changeHref) return <strong className="wrap-anywhere">{job.number}</strong>;
  return (
    <Link href={job.changeHref} className="wrap-anywhere">
      <strong>{job.number}</strong>
    </Link>
  );
}

/** The layers, and for those who may, the way to what taking them off would cost. */
function JobLayers({ job }: { job: JobView }) {
  if (!job.stripHref) return job.layers;
  return (
    <Link href={job.stripHref} aria-label={`Work out stripping ${job.layers} off ${job.number}`}>
      {job.layers}
    </Link>
  );
}
