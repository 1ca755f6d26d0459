import type { IncomingMessage } from "node:http";
import type { z } from "zod";
import { Refusal } from "./refusal";

async function readBody(request: IncomingMessage, limit: number): Promise<Buffer> {
  const parts: Buffer[] = [];
  let size = 0;
  for await (const chunk of request.iterator({ destroyOnReturn: false })) {
    const part = Buffer.from(chunk);
    size += part.length;
    if (size > limit) throw new Refusal(413, "too_large", `The body is larger than ${limit} bytes.`);
    parts.push(part);
  }
  return Buffer.concat(parts);
}

export async function readJson(request: IncomingMessage, limit: number): Promise<unknown> {
  const text = (await readBody(request, limit)).toString("utf8");
  try {
    return text === "" ? {} : JSON.parse(text);
  } catch {
    throw new Refusal(400, "validation_error", "The body is not JSON.");
  }
}

export async function readAs<T>(schema: z.ZodType<T>, request: IncomingMessage, limit = 1_000_000): Promise<T> {
  const parsed = schema.safeParse(await readJson(request, limit));
  if (parsed.success) return parsed.data;
  const [issue] = parsed.error.issues;
  throw new Refusal(400, "validation_error", `${issue?.path.join(".") ?? "body"}: ${issue?.message ?? "not valid"}`);
}
