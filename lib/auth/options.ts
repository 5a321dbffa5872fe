import "server-only";
import type { NextAuthOptions } from "next-auth";
import CredentialsProvider from "next-auth/providers/credentials";
import { addressOf } from "@/lib/auth/address";
import { signInWithLink, signInWithPassword } from "@/lib/auth/sign-in";
import { env } from "@/lib/config/env";
import { AppError } from "@/lib/shared/errors";

declare module "next-auth" {
  interface User {
    id: string;
    sessionEpoch: number;
  }
  interface Session {
    userId: string;
    sessionEpoch: number;
  }
}

declare module "next-auth/jwt" {
  interface JWT {
    userId?: string;
    sessionEpoch?: number;
  }
}

const THIRTY_DAYS_S = 30 * 24 * 3600;

/** Sessions are signed cookies; every request checks their epoch against the database (see get-actor). */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: "jwt", maxAge: THIRTY_DAYS_S },
    pages: { signIn: "/sign-in", error: "/sign-in" },
    providers: [
      CredentialsProvider({
        id: "password",
        credentials: { email: {}, password: {} },
        authorize: (credentials, request) =>
          asAuthError(() =>
            signInWithPassword(
              credentials?.email ?? "",
              credentials?.password ?? "",
              addressOf(request.headers),
            ),
          ),
      }),
      CredentialsProvider({
        id: "link",
        credentials: { secret: {} },
        authorize: (credentials, request) =>
          asAuthError(() => signInWithLink(credentials?.secret ?? "", addressOf(request.headers))),
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { userId: user.id, sessionEpoch: user.sessionEpoch } : token),
      session: ({ session, token }) => ({
        expires: session.expires,
        userId: token.userId ?? "",
        sessionEpoch: token.sessionEpoch ?? 0,
      }),
    },
  };
}

/** next-auth hands the message of an error to the page; a rate limit tells how long to wait. */
async function asAuthError<T>(attempt: () => Promise<T>): Promise<T> {
  try {
    return await attempt();
  } catch (error) {
    if (error instanceof AppError) throw new Error(error.message, { cause: error });
    throw error;
  }
}
