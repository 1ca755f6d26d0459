/** Says that the process answers, and nothing else: no session, no database. `/api/health` says whether all is well. */
export function GET(): Response {
  return new Response(null, { status: 204, headers: { "cache-control": "no-store" } });
}
