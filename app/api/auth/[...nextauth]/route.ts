import type { NextRequest } from "next/server";
import NextAuth from "next-auth";
import { fault } from "@/lib/fault";
import { authOptions } from "@/lib/server/auth-options";
import { problemResponse } from "@/lib/server/handle";

interface AuthRoute {
  params: Promise<{ nextauth: string[] }>;
}

/** An e-mail, a password and a token are far below this; next-auth itself reads whatever comes. */
const MOST_BYTES = 16 * 1024;

/** next-auth's own routes: they check their own token against forgery, and `authorize` limits the tries. */
const answer: (request: NextRequest, context: AuthRoute) => Promise<Response> = NextAuth(authOptions);

export const GET = answer;

export async function POST(request: NextRequest, context: AuthRoute): Promise<Response> {
  const bytes = Number(request.headers.get("content-length") ?? Number.NaN);
  if (bytes <= MOST_BYTES) return answer(request, context);
  return problemResponse(fault("too-large", "That is more than a sign-in needs. Send e-mail and password only.").fault);
}
