import { randomUUID } from "node:crypto";
import { z } from "zod";
import { Refusal } from "../http/refusal";
import type { Message } from "./accepted-requests";
import { readMail } from "./mail-schema";

type Made = { answer: unknown; messages: Message[] };

const waiting = (body: unknown): Message => ({ id: randomUUID(), mail: readMail(body), state: "waiting" });

export function makeOne(body: unknown): Made {
  const message = waiting(body);
  return { answer: { id: message.id }, messages: [message] };
}

const batchSchema = z.array(z.looseObject({})).min(1).max(100);

/** A batch is all or nothing ("strict"), or what is right of it with a list of what is wrong ("permissive"). */
export function makeBatch(body: unknown, isPermissive: boolean): Made {
  const parsed = batchSchema.safeParse(body);
  if (!parsed.success) throw new Refusal(422, "validation_error", "A batch is a list of 1 to 100 messages.");
  const messages: Message[] = [];
  const errors: { index: number; message: string }[] = [];
  parsed.data.forEach((entry, index) => {
    try {
      if ("attachments" in entry)
        throw new Refusal(422, "validation_error", "Attachments are not supported in a batch.");
      messages.push(waiting(entry));
    } catch (error) {
      if (!(error instanceof Refusal)) throw error;
      if (!isPermissive) throw new Refusal(error.status, error.code, `Message ${index}: ${error.message}`);
      errors.push({ index, message: error.message });
    }
  });
  const data = messages.map(({ id }) => ({ id }));
  return { answer: isPermissive ? { data, errors } : { data }, messages };
}
