import type { Faults } from "./faults";
import { Refusal } from "./refusal";
import { sendJson } from "./send";
import type { Call } from "./serve-loopback";

type Admin = {
  name: string;
  faults: Faults;
  /** Lists by name: GET /__fake/<name>. */
  lists: Record<string, () => unknown>;
  /** What POST /__fake/clear forgets. */
  clear(): void | Promise<void>;
};

/** The addresses for tests, under /__fake/. Returns false when the address is none of them. */
export async function answerAdmin({ request, response, url }: Call, admin: Admin): Promise<boolean> {
  if (!url.pathname.startsWith("/__fake/")) return false;
  const { origin } = request.headers;
  if (origin !== undefined && origin !== url.origin) throw new Refusal(403, "forbidden_origin", "Not for other pages.");

  const action = `${request.method} ${url.pathname.slice("/__fake/".length)}`;
  const list = request.method === "GET" ? admin.lists[url.pathname.slice("/__fake/".length)] : undefined;
  if (action === "GET health") sendJson(response, 200, { ok: true, name: admin.name });
  else if (action === "POST fail") sendJson(response, 200, { ordered: admin.faults.order(url.searchParams) });
  else if (action === "GET fail") sendJson(response, 200, { waiting: admin.faults.waiting() });
  else if (action === "DELETE fail") sendJson(response, 200, { waiting: admin.faults.clear() });
  else if (action === "POST clear") {
    admin.faults.clear();
    await admin.clear();
    sendJson(response, 200, { ok: true });
  } else if (list) sendJson(response, 200, await list());
  else throw new Refusal(404, "not_found", "No such address for tests.");
  return true;
}
