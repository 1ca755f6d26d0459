import { NextResponse, type NextRequest } from "next/server";
import { contentSecurityPolicy, plainSecurityHeaders } from "@/lib/http/security-headers";

/** Gives every request its id and every answer its security headers. Nobody is let in or turned away here. */
export function proxy(request: NextRequest): NextResponse {
  const requestId = crypto.randomUUID();
  const isHttps = process.env.APP_URL?.startsWith("https:") ?? false;
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(18))).toString("base64");
  const policy = contentSecurityPolicy({
    nonce,
    isHttps,
    isDevelopment: process.env.NODE_ENV === "development",
    ingestUrl: process.env.UPLOADTHING_INGEST_URL || undefined,
  });

  // Whatever a client sends under these names is replaced. Next reads the nonce out of the policy.
  const headers = new Headers(request.headers);
  headers.set("x-request-id", requestId);
  headers.set("content-security-policy", policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set("x-request-id", requestId);
  response.headers.set("content-security-policy", policy);
  for (const [name, value] of Object.entries(plainSecurityHeaders(isHttps))) response.headers.set(name, value);
  return response;
}

export const config = { matcher: ["/((?!_next/static|_next/image).*)"] };
