import "server-only";
import type { NextRequest } from "next/server";
import type { z } from "zod";
import { getDb } from "@/db/client";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { fault, FAULT_STATUS, toProblem, type Fault } from "@/lib/fault";
import type { Permission } from "@/lib/permissions";
import { readEnv } from "@/lib/env";
import { demand, faultOf, parseInput } from "./faults";
import { wakeJobs } from "./job-clock";
import { currentMember } from "./session";

interface HandleDefinition<Schema extends z.ZodType, Result> {
  permission: Permission;
  /** One schema for the path's parameters, the query and the JSON body together. */
  input: Schema;
  /** Returns what is sent as JSON, or a whole Response where it is not JSON. */
  run: (context: {
    member: SignedIn;
    db: Db;
    now: number;
    input: z.output<Schema>;
    request: NextRequest;
  }) => Result | Response | Promise<Result | Response>;
  /** Status of a JSON answer; 200 unless said. */
  status?: number;
}

type RouteContext = { params: Promise<Record<string, string | string[]>> };

const MAX_JSON_BYTES = 256 * 1024;

/** Builds a route handler. Order: who → may they → parse → run. Faults go out as problem+json (RFC 9457). */
export function handle<Schema extends z.ZodType, Result>(definition: HandleDefinition<Schema, Result>) {
  return async (request: NextRequest, context: RouteContext): Promise<Response> => {
    try {
      const member = demand(await currentMember(), definition.permission);
      if (request.method !== "GET") demandOwnOrigin(request);
      const raw = { ...(await readBody(request)), ...queryOf(request), ...(await context.params) };
      const input = parseInput(definition.input, raw);
      const result = await definition.run({ member, db: getDb(), now: Date.now(), input, request });
      if (request.method !== "GET") wakeJobs();
      if (result instanceof Response) return result;
      return Response.json(result, { status: definition.status ?? 200, headers: { "Cache-Control": "no-store" } });
    } catch (error) {
      return problemResponse(faultOf(error, `${request.method} ${request.nextUrl.pathname}`));
    }
  };
}

/** A fault as an HTTP answer. */
export function problemResponse(problem: Fault): Response {
  return Response.json(toProblem(problem), {
    status: FAULT_STATUS[problem.code],
    headers: { "Content-Type": "application/problem+json", "Cache-Control": "no-store" },
  });
}

/** A browser names the page a request comes from; one from elsewhere is refused whatever cookie it carries. */
function demandOwnOrigin(request: NextRequest): void {
  const origin = request.headers.get("origin");
  if (origin && origin !== new URL(readEnv().NEXTAUTH_URL).origin) {
    throw fault("refused", "This request came from another site. Open Coppertell itself and try again.");
  }
}

function queryOf(request: NextRequest): Record<string, string> {
  return Object.fromEntries(request.nextUrl.searchParams);
}

async function readBody(request: NextRequest): Promise<Record<string, unknown>> {
  if (request.method === "GET" || !request.headers.get("content-type")?.includes("json")) return {};
  const text = await request.text();
  if (text.length > MAX_JSON_BYTES) throw fault("too-large", "The request is larger than 256 kB. Send less at once.");
  let body: unknown;
  try {
    body = JSON.parse(text);
  } catch (error) {
    throw Object.assign(bodyFault("The request is not JSON. Check its brackets and quotes."), { cause: error });
  }
  if (typeof body !== "object" || body === null || Array.isArray(body)) {
    throw bodyFault("The request must be a JSON object, in curly brackets.");
  }
  return body as Record<string, unknown>;
}

/** The whole body is at fault: there is no field to name but it. */
const bodyFault = (words: string) => fault("invalid", words, { body: words });
