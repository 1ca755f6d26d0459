import { createServer } from "node:http";
import { once } from "node:events";
import type { AttachmentKind } from "@/db/schema/evidence";
import type { UploadAnswer } from "@/lib/attachment/schema";
import { receiveUploadRequest } from "@/lib/attachment/upload-handler";
import { z } from "zod";

/** The upload route behind a real address, so that the object store can call it back. */
export async function startUploadApp() {
  const server = createServer(async (incoming, response) => {
    const parts: Buffer[] = [];
    for await (const chunk of incoming) parts.push(Buffer.from(chunk));
    const headers = new Headers();
    for (const [name, value] of Object.entries(incoming.headers))
      if (typeof value === "string") headers.set(name, value);
    const url = `http://${incoming.headers.host}${incoming.url}`;
    const answer = await receiveUploadRequest(
      new Request(url, { method: "POST", headers, body: Buffer.concat(parts) }),
    );
    response.writeHead(answer.status, { "content-type": answer.headers.get("content-type") ?? "application/json" });
    response.end(Buffer.from(await answer.arrayBuffer()));
  });
  server.listen(0, "127.0.0.1");
  await once(server, "listening");
  const address = server.address();
  if (address === null || typeof address === "string") throw new Error("no port");
  process.env.UPLOADTHING_CALLBACK_URL = `http://127.0.0.1:${address.port}/api/uploadthing`;
  return { url: process.env.UPLOADTHING_CALLBACK_URL, close: () => server.close() };
}

export type Sending = {
  project: string;
  name: string;
  bytes: Uint8Array;
  uploadId?: string;
  kinds?: AttachmentKind[];
  checkId?: string;
  logEntryId?: string;
  /** What is said of the size before sending; the true one unless given. */
  announced?: number;
};

const ALL: AttachmentKind[] = ["photo", "scope-picture", "scope-data"];

/** Asks for a link to send to, as the page does. */
export async function announce(
  app: { url: string },
  { project, name, bytes, announced, ...rest }: Sending,
): Promise<Response> {
  const input = { project, uploadId: crypto.randomUUID(), kinds: ALL, ...rest };
  return fetch(`${app.url}?actionType=upload&slug=evidence`, {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: JSON.stringify({
      files: [{ name, size: announced ?? bytes.length, type: "application/octet-stream" }],
      input,
    }),
  });
}

const linkSchema = z.array(z.object({ url: z.string(), key: z.string() })).length(1);

export async function linkFor(app: { url: string }, sending: Sending) {
  const response = await announce(app, sending);
  if (!response.ok) throw new Error(`refused with ${response.status}: ${await response.text()}`);
  const [link] = linkSchema.parse(await response.json());
  if (!link) throw new Error("no link");
  return link;
}

/** Sends the bytes to the object store and answers what the app said when it was called back. */
export async function putTo(link: { url: string }, name: string, bytes: Uint8Array): Promise<UploadAnswer> {
  const form = new FormData();
  form.append("file", new File([new Uint8Array(bytes)], name));
  const response = await fetch(link.url, { method: "PUT", body: form, headers: { range: "bytes=0-" } });
  const body: unknown = await response.json();
  // What onUploadComplete of our own router answered.
  if (response.ok && typeof body === "object" && body !== null && "serverData" in body)
    return body.serverData as UploadAnswer;
  throw new Error(`the object store answered ${response.status}: ${JSON.stringify(body)}`);
}

export async function send(app: { url: string }, sending: Sending): Promise<UploadAnswer> {
  return putTo(await linkFor(app, sending), sending.name, sending.bytes);
}
