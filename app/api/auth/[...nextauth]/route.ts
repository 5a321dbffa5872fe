import type { NextRequest } from "next/server";
import NextAuth from "next-auth";
import { authOptions } from "@/lib/auth/options";

/** next-auth keeps its own doors: CSRF token, sign-in callbacks, session, sign-out. */
async function handler(
  request: NextRequest,
  context: { params: Promise<{ nextauth: string[] }> },
): Promise<Response> {
  return NextAuth(request, { params: await context.params }, authOptions());
}

export { handler as GET, handler as POST };
