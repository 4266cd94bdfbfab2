import NextAuth from "next-auth";
import { authOptions } from "@/lib/auth/options";

type Context = { params: Promise<{ nextauth: string[] }> };

/** next-auth's own endpoints: sign-in, sign-out, session and the token against forged forms. */
function handler(request: Request, context: Context): Promise<Response> {
  return NextAuth(authOptions())(request, context);
}

export { handler as GET, handler as POST };
