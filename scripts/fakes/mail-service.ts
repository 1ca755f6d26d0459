import { join } from "node:path";
import { setTimeout as delay } from "node:timers/promises";
import { answerAdmin } from "./http/admin";
import { equalTexts } from "./http/equal-texts";
import { createFaults } from "./http/faults";
import { readJson } from "./http/read-json";
import { Refusal } from "./http/refusal";
import { sendJson } from "./http/send";
import { serveLoopback, type Call } from "./http/serve-loopback";
import { openAcceptedRequests } from "./mail-service/accepted-requests";
import { createDelivery } from "./mail-service/deliver";
import { makeBatch, makeOne } from "./mail-service/make-messages";
import { holdingKey, oncePerKey } from "./mail-service/once-per-key";
import { endOnSignals, host, portSetting, setting } from "./settings";

// A stand-in for the mail service: what the Resend SDK asks for; every message goes on by SMTP.
const apiKey = setting("FAKE_API_KEY");
const requests = await openAcceptedRequests(join(setting("FAKE_DATA_DIR"), "requests"));
const delivery = createDelivery(requests, setting("FAKE_SMTP_URL"));
const accept = oncePerKey(requests);
const faults = createFaults(["emails", "batch"]);
const bodyLimit = 50_000_000;

const sent = () => {
  const messages = requests.list().flatMap(({ acceptedAt, key, messages }) => {
    return messages.map(({ id, mail, state, note }) => ({
      id,
      acceptedAt,
      key,
      to: mail.to,
      subject: mail.subject,
      state,
      note,
    }));
  });
  return { messages };
};
const admin = { name: "mail-service", faults, lists: { sent }, clear: () => requests.clear() };

function checkBearer({ request }: Call): void {
  const given = /^Bearer (.+)$/.exec(request.headers.authorization ?? "")?.[1];
  if (given === undefined) throw new Refusal(401, "missing_api_key", "Missing API key in the authorization header.");
  if (!equalTexts(given, apiKey)) throw new Refusal(403, "invalid_api_key", "API key is invalid.");
}

async function answerSend(
  { request, response, url }: Call,
  kind: "emails" | "batch",
  key: string | undefined,
): Promise<void> {
  const body = await readJson(request, bodyLimit);
  const isPermissive = request.headers["x-batch-validation"] === "permissive";
  const make = () => (kind === "emails" ? makeOne(body) : makeBatch(body, isPermissive));
  const { accepted, isNew } = await accept({ path: url.pathname, key, body, make });
  // Usually delivered before the answer, which is handy in tests; a slow mail server does not hold the answer up.
  if (isNew) await Promise.race([delivery.deliver(accepted), delay(1500)]);
  sendJson(response, 200, accepted.answer);
}

function answerOne({ response, url }: Call): void {
  const found = requests.findMessage(url.pathname.slice("/emails/".length));
  if (!found) throw new Refusal(404, "not_found", "Email not found.");
  const { id, mail, state } = found.message;
  const { from, to, cc = [], bcc = [], reply_to = [], subject, html = null, text = null } = mail;
  const created_at = new Date(found.accepted.acceptedAt).toISOString();
  const last_event = state === "waiting" ? "queued" : state;
  sendJson(response, 200, {
    object: "email",
    id,
    from,
    to,
    cc,
    bcc,
    reply_to,
    subject,
    html,
    text,
    created_at,
    last_event,
  });
}

async function answer(call: Call): Promise<void> {
  const { request, url } = call;
  if (await answerAdmin(call, admin)) return;
  checkBearer(call);
  const kinds: Record<string, "emails" | "batch"> = { "/emails": "emails", "/emails/batch": "batch" };
  const kind = request.method === "POST" ? kinds[url.pathname] : undefined;
  if (kind) {
    const header = request.headers["idempotency-key"];
    const key = typeof header === "string" ? header : undefined;
    return holdingKey(key, () => faults.during(kind, call, () => answerSend(call, kind, key)));
  }
  if (request.method === "GET" && url.pathname.startsWith("/emails/")) return answerOne(call);
  throw new Refusal(404, "not_found", "No such address.");
}

const server = await serveLoopback({
  name: "mail service",
  host: host(),
  port: portSetting("FAKE_PORT"),
  handler: answer,
});
endOnSignals(() => {
  server.close();
  delivery.close();
});
