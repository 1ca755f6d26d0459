import type { Settled, TakenDelivery } from "@/db/queries/digest-deliveries";
import { log } from "@/lib/http/log";
import { sendMail } from "@/lib/mail/send";
import type { DigestWriter } from "./digest-writer";

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;

/** A few at a time: the mail service counts requests a second. */
const LANES = 4;
/** So many refusals in a row mean that the service is away; the rest would only wait for its time limit. */
const REFUSALS = 5;
/** Mail services forget an idempotency key after a day: what was not taken by then is not tried again. */
const GIVE_UP_MS = 20 * HOUR;

type Run = { deadline: number; timeoutMs?: number; signal?: AbortSignal | undefined };

/** Sends each delivery under its own id as key and tells what became of it. Never throws for one that fails. */
export async function sendDeliveries(
  deliveries: readonly TakenDelivery[],
  writer: DigestWriter,
  { deadline, timeoutMs, signal }: Run,
): Promise<Settled[]> {
  const outcomes: Settled[] = [];
  const waiting = [...deliveries];
  let refusals = 0;
  const goesOn = () => refusals < REFUSALS && Date.now() < deadline && !signal?.aborted;

  async function lane(): Promise<void> {
    for (let one = waiting.shift(); one; one = waiting.shift()) {
      if (!goesOn()) {
        waiting.unshift(one);
        return;
      }
      const outcome = await sendOne(one, writer, timeoutMs);
      refusals = outcome.state === "claimed" ? refusals + 1 : 0;
      outcomes.push(outcome);
    }
  }
  await Promise.all(Array.from({ length: LANES }, lane));
  const isAway = refusals >= REFUSALS;
  // What was not tried is free again at once, or, when the service is away, when the others are.
  return [...outcomes, ...waiting.map((one) => (isAway ? later(one, "the service was away") : free(one)))];
}

async function sendOne(one: TakenDelivery, writer: DigestWriter, timeoutMs?: number): Promise<Settled> {
  if (!one.gets) return { ...settled(one, "failed"), error: "Not a member any more, or the address takes no mail." };
  try {
    const message = await writer.write(one);
    if (!message) return settled(one, "quiet");
    const sent = await sendMail(message, { idempotencyKey: one.id, ...(timeoutMs ? { timeoutMs } : {}) });
    if (sent.ok) return settled(one, "sent");
    if (sent.bounced) return { ...settled(one, "failed"), error: sent.message, bounced: true };
    return later(one, sent.message);
  } catch (error) {
    log().error({ deliveryId: one.id, err: error }, "a digest could not be written");
    return later(one, "it could not be written");
  }
}

function settled({ id, userId }: TakenDelivery, state: Settled["state"]): Settled {
  return { id, userId, state, error: null, nextTryAt: new Date(), bounced: false };
}

const free = (one: TakenDelivery): Settled => settled(one, "claimed");

/** One, two, four minutes and so on, up to an hour; given up after most of a day. */
function later(one: TakenDelivery, error: string): Settled {
  if (Date.now() - one.createdAt.getTime() > GIVE_UP_MS) return { ...settled(one, "failed"), error };
  const wait = Math.min(HOUR, MINUTE * 2 ** Math.min(10, one.tries - 1));
  return { ...settled(one, "claimed"), error, nextTryAt: new Date(Date.now() + wait) };
}
