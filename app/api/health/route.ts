import { health } from "@/lib/server/health";

/** For whoever watches the server: no sign-in, and nothing that belongs to a shop. */
export async function GET(): Promise<Response> {
  const { isWell, report } = await health();
  return Response.json(report, { status: isWell ? 200 : 503, headers: { "Cache-Control": "no-store" } });
}

export const dynamic = "force-dynamic";
