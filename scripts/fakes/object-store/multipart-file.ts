import type { IncomingMessage } from "node:http";
import { Refusal } from "../http/refusal";

const bad = (message: string) => new Refusal(400, "validation_error", message);
const headLimit = 16_384;

function boundaryOf(request: IncomingMessage): string {
  const match = /^multipart\/form-data;.*boundary=(?:"([^"]+)"|([^;\s]+))/i.exec(request.headers["content-type"] ?? "");
  const boundary = match?.[1] ?? match?.[2];
  if (boundary === undefined) throw bad("The body should be a form with one file.");
  return boundary;
}

/** The bytes of the one part named "file" of a form, as they arrive. Throws when the form ends too early. */
export async function* multipartFile(request: IncomingMessage): AsyncGenerator<Buffer> {
  const boundary = boundaryOf(request);
  const end = Buffer.from(`\r\n--${boundary}`);
  let held: Buffer = Buffer.alloc(0);
  let state: "head" | "file" | "after" = "head";

  // A consumer that stops early still has to answer: the connection stays.
  for await (const chunk of request.iterator({ destroyOnReturn: false })) {
    if (state === "after") continue;
    held = Buffer.concat([held, Buffer.from(chunk)]);
    if (state === "head") {
      const headEnd = held.indexOf("\r\n\r\n");
      if (headEnd < 0 && held.length > headLimit) throw bad("The form's head is too long.");
      if (headEnd < 0) continue;
      const head = held.subarray(0, headEnd).toString("utf8");
      if (!head.startsWith(`--${boundary}`) || !/name="file"/.test(head))
        throw bad('The form should hold one part named "file".');
      held = held.subarray(headEnd + 4);
      state = "file";
    }
    const at = held.indexOf(end);
    if (at >= 0) {
      if (at > 0) yield held.subarray(0, at);
      state = "after";
      continue;
    }
    // The boundary may be cut between two chunks: its length is held back.
    const safe = held.length - end.length;
    if (safe <= 0) continue;
    yield held.subarray(0, safe);
    held = held.subarray(safe);
  }
  if (state !== "after") throw bad("The upload ended before the file did.");
}
