import type { NextRequest } from "next/server";
import NextAuth from "next-auth";
import { authOptions } from "@/lib/server/auth-options";

interface AuthRoute {
  params: Promise<{ nextauth: string[] }>;
}

/** next-auth's own routes: they check their own token against forgery, and `authorize` limits the tries. */
const handler: (request: NextRequest, context: AuthRoute) => Promise<Response> = NextAuth(authOptions);

export { handler as GET, handler as POST };
