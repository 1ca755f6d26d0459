import type { ServerResponse } from "node:http";
import { Refusal } from "../http/refusal";
import { sendEmpty, sendJson } from "../http/send";
import type { Call } from "../http/serve-loopback";
import type { MessageFiles } from "./message-files";
import { listPage, messagePage, readView } from "./pages";
import { parseSource, readMessage } from "./read-message";

const pagePolicy =
  "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'";
/** A message is somebody else's HTML: no script, no form, no style sheet from elsewhere; links open on their own. */
const messagePolicy =
  "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src 'self' data: http: https:";

function send(
  response: ServerResponse,
  type: string,
  policy: string,
  body: string | Buffer,
  extra: Record<string, string> = {},
): void {
  const bytes = Buffer.from(body);
  const headers = { "content-type": type, "content-length": bytes.length, "content-security-policy": policy };
  response.writeHead(200, {
    ...headers,
    "x-content-type-options": "nosniff",
    "referrer-policy": "no-referrer",
    ...extra,
  });
  response.end(bytes);
}

const htmlType = "text/html; charset=utf-8";

function find(files: MessageFiles, id: string | undefined) {
  const found = files.find(id ?? "");
  if (!found) throw new Refusal(404, "not_found", "No such message.");
  return found;
}

async function sendHtml(response: ServerResponse, files: MessageFiles, id: string): Promise<void> {
  const source = await files.source(id);
  const mail = await parseSource(source);
  const indexOf = (cid: string) => mail.attachments.findIndex((attachment) => attachment.cid === cid);
  const markup = typeof mail.html === "string" ? mail.html : "";
  const body = markup.replace(
    /cid:([^"'\s)>]+)/g,
    (_, cid: string) => `/messages/${id}/attachments/${indexOf(decodeURIComponent(cid))}`,
  );
  send(response, htmlType, messagePolicy, `<base target="_blank">${body}`, {
    "cross-origin-resource-policy": "same-origin",
  });
}

async function sendAttachment(response: ServerResponse, files: MessageFiles, id: string, index: number): Promise<void> {
  const attachment = (await parseSource(await files.source(id))).attachments[index];
  if (!attachment) throw new Refusal(404, "not_found", "No such attachment.");
  const isPicture = /^image\/(png|jpeg|gif|webp)$/.test(attachment.contentType);
  const name = encodeURIComponent(attachment.filename ?? "file").replaceAll("'", "%27");
  const disposition = `${isPicture ? "inline" : "attachment"}; filename*=UTF-8''${name}`;
  const type = isPicture ? attachment.contentType : "application/octet-stream";
  send(response, type, "default-src 'none'; sandbox", attachment.content, { "content-disposition": disposition });
}

/** The pages for people: the list, one message, its HTML on its own, its attachments. */
export async function answerPages({ request, response, url }: Call, files: MessageFiles): Promise<boolean> {
  if (request.method !== "GET") return false;
  if (url.pathname === "/") {
    send(response, htmlType, pagePolicy, listPage(files.list()));
    return true;
  }
  const [, id, part, index] = /^\/messages\/([\w-]+)(?:\/(html|attachments\/(\d+)))?$/.exec(url.pathname) ?? [];
  if (id === undefined) return false;
  const summary = find(files, id);
  if (part === "html") await sendHtml(response, files, id);
  else if (index !== undefined) await sendAttachment(response, files, id, Number(index));
  else {
    const source = await files.source(id);
    const message = await readMessage(summary, source);
    send(
      response,
      htmlType,
      pagePolicy,
      messagePage(message, readView(url.searchParams.get("view")), source.toString("utf8")),
    );
  }
  return true;
}

/** The addresses for programs: GET and DELETE /api/messages, GET /api/messages/ID and its source. */
export async function answerApi({ request, response, url }: Call, files: MessageFiles): Promise<boolean> {
  if (url.pathname === "/api/messages" && request.method === "DELETE") {
    if (request.headers.origin !== undefined) throw new Refusal(403, "forbidden_origin", "Not for other pages.");
    await files.clear();
    sendEmpty(response, 204);
    return true;
  }
  if (request.method !== "GET") return false;
  if (url.pathname === "/api/messages") {
    const to = url.searchParams.get("to")?.toLowerCase();
    const messages = files
      .list()
      .filter((one) => to === undefined || one.to.some((address) => address.toLowerCase() === to));
    sendJson(response, 200, messages);
    return true;
  }
  const [, id, part] = /^\/api\/messages\/([\w-]+)(\/source)?$/.exec(url.pathname) ?? [];
  if (id === undefined) return false;
  const summary = find(files, id);
  const source = await files.source(id);
  if (part === undefined) sendJson(response, 200, await readMessage(summary, source));
  else send(response, "text/plain; charset=utf-8", "default-src 'none'; sandbox", source);
  return true;
}
