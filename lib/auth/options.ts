import "server-only";
import type { NextAuthOptions } from "next-auth";
import CredentialsProvider from "next-auth/providers/credentials";
import { z } from "zod";
import { database } from "@/lib/database";
import { env } from "@/lib/env";
import { logError } from "@/lib/log";
import { verifyPassword } from "./password";
import { findCredentials } from "./queries";

const SignIn = z.object({
  email: z
    .string()
    .trim()
    .max(254)
    .refine((email) => !email.includes("\0")), // PostgreSQL's text cannot hold it
  password: z.string().max(1000),
});

declare module "next-auth" {
  interface Session {
    personId?: string;
    sessionVersion?: number;
  }
  interface User {
    sessionVersion: number;
  }
}
declare module "next-auth/jwt" {
  interface JWT {
    sessionVersion?: number;
  }
}

async function checkCredentials({ email, password }: z.infer<typeof SignIn>) {
  const person = await findCredentials(database(), email);
  const fits = await verifyPassword(person?.passwordHash ?? null, password);
  return fits && person ? { id: person.id, sessionVersion: person.sessionVersion } : null;
}

/** Sign-in by e-mail and password. The token holds an id and a version; all rights are read from the database. */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: "jwt", maxAge: 12 * 60 * 60 },
    pages: { signIn: "/sign-in", error: "/sign-in" },
    providers: [
      CredentialsProvider({
        credentials: { email: {}, password: {} },
        async authorize(input) {
          const parsed = SignIn.safeParse(input);
          if (!parsed.success) return null;
          return checkCredentials(parsed.data).catch((error: unknown) => {
            logError(error, { path: "/api/auth" });
            throw new Error("unavailable"); // next-auth puts the message into an address: nothing of the inside
          });
        },
      }),
    ],
    callbacks: {
      jwt({ token, user }) {
        if (!user) return token;
        return { sub: user.id, sessionVersion: user.sessionVersion };
      },
      session({ session, token }) {
        return { expires: session.expires, personId: token.sub, sessionVersion: token.sessionVersion };
      },
    },
  };
}
