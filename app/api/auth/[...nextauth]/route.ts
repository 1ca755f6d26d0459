import { NextResponse, type NextRequest } from "next/server";
import { handlers } from "@/lib/auth/auth";
import { callFrom } from "@/lib/http/call";
import { problem } from "@/lib/http/problem";
import { sameOrigin } from "@/lib/http/same-origin";

/**
 * The one address of the session library that is open: the press on the page of a sign-in link. Everything else goes
 * through our own actions, which count tries; the library's own ways in would pass them by.
 */
export async function GET(request: NextRequest): Promise<Response> {
  if (request.nextUrl.pathname !== "/api/auth/callback/link") {
    return problem({ code: "not-found", message: "There is nothing here." }, callFrom(request.headers).requestId);
  }
  if (!sameOrigin(request)) {
    return NextResponse.redirect(new URL(`/sign-in/link${request.nextUrl.search}`, request.nextUrl));
  }
  return handlers.GET(request);
}
