import { after } from "next/server";
import { log } from "./log";

/**
 * Does slow work when the answer is out, so that the time of the answer says nothing of whether there was any work.
 * Outside a request (tests, worker) it is done at once.
 */
export async function afterAnswer(name: string, work: () => Promise<void>): Promise<void> {
  const logged = () =>
    work().catch((error: unknown) => log().error({ name, err: error }, "work after the answer failed"));
  try {
    after(logged);
  } catch {
    await logged();
  }
}
