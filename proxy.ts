import { type NextRequest, NextResponse } from "next/server";

const SESSION_COOKIES = ["next-auth.session-token", "__Secure-next-auth.session-token"];

/** Sends people without a session to the sign-in page early. Access itself is checked by every page and handler. */
export function proxy(request: NextRequest) {
  if (SESSION_COOKIES.some((name) => request.cookies.has(name))) return NextResponse.next();
  const signIn = new URL("/sign-in", request.url);
  if (request.nextUrl.pathname !== "/") signIn.searchParams.set("next", request.nextUrl.pathname);
  return NextResponse.redirect(signIn);
}

// Never in front of the API: uploads would be cut, and clients there expect problems, not redirects.
export const config = { matcher: ["/((?!api/|_next/|sign-in$|cautions$|method$|icon\\.svg$|.*\\..*).*)"] };
