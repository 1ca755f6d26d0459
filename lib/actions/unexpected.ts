import type { Call } from "@/lib/http/call";
import { log } from "@/lib/http/log";
import { RefusalError, refuse, type Answer } from "./answer";
import { DatabaseAwayError } from "./database-away";

const CONNECTION_CODES = new Set([
  "ECONNREFUSED",
  "ECONNRESET",
  "CONNECT_TIMEOUT",
  "CONNECTION_CLOSED",
  "CONNECTION_ENDED",
  "CONNECTION_DESTROYED",
  "57P01",
  "57P02",
  "57P03",
  "53300",
]);

function causes(error: unknown): unknown[] {
  return error instanceof Error && error.cause !== undefined ? [error, ...causes(error.cause)] : [error];
}

/** True when the database did not answer, as opposed to a defect of ours. */
export function isDatabaseAway(error: unknown): boolean {
  return causes(error).some((cause) => {
    const code = cause instanceof Error && "code" in cause ? cause.code : undefined;
    return typeof code === "string" && CONNECTION_CODES.has(code);
  });
}

/** For what a page reads: an absent database gets a name that the error page knows; anything else travels on as it is. */
export async function orDatabaseAway<Value>(work: () => Promise<Value>): Promise<Value> {
  try {
    return await work();
  } catch (error) {
    throw isDatabaseAway(error) && !(error instanceof DatabaseAwayError) ? new DatabaseAwayError(error) : error;
  }
}

/** Next signals redirect() and notFound() by throwing; those must travel on. */
function isFrameworkSignal(error: unknown): boolean {
  return (
    error instanceof Error && "digest" in error && typeof error.digest === "string" && error.digest.startsWith("NEXT_")
  );
}

/** Expected refusals as they are; anything else is logged with the request id and shown as that id. */
export function answerForError(error: unknown, call: Call, name: string): Answer<never> {
  if (isFrameworkSignal(error)) throw error;
  if (error instanceof RefusalError) return { ok: false, error: error.refusal };
  if (isDatabaseAway(error)) {
    log().error({ requestId: call.requestId, name, err: error }, "the database does not answer");
    return refuse("unavailable", "The database does not answer just now. Nothing was changed; try again in a moment.");
  }
  log().error({ requestId: call.requestId, name, err: error }, "unexpected error");
  return refuse(
    "failed",
    `Something went wrong on our side, nothing was changed. Tell the maintainer this number: ${call.requestId}.`,
  );
}
