import { env } from "@/lib/env";

/** Whether a changing request comes from our own pages (or from no browser at all). */
export function sameOrigin(request: Request): boolean {
  const site = request.headers.get("sec-fetch-site");
  if (site !== null) return site === "same-origin" || site === "none";
  const origin = request.headers.get("origin");
  return origin === null || origin === new URL(env().APP_URL).origin;
}
