import { notFound } from "next/navigation";
import { readEnv } from "@/lib/env";

/** Nothing but the frame that every page has: what the browser tests weigh other pages against. */
export default function EmptyPage() {
  const env = readEnv();
  if (env.NODE_ENV === "production" && env.COPPERTELL_GALLERY !== "1") notFound();
  return <main />;
}
