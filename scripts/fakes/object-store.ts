import { answerAdmin } from "./http/admin";
import { createFaults } from "./http/faults";
import { Refusal } from "./http/refusal";
import { sendEmpty } from "./http/send";
import { serveLoopback, type Call } from "./http/serve-loopback";
import { answerApi, isApi } from "./object-store/answer-api";
import { answerRead } from "./object-store/answer-read";
import { answerResume, answerUpload } from "./object-store/answer-upload";
import { corsHeaders } from "./object-store/cors";
import { openStore } from "./object-store/store";
import { endOnSignals, host, portSetting, setting } from "./settings";

// A stand-in for the object store: what the UploadThing SDK asks for, with files on disk.
const store = await openStore({
  dataDir: setting("FAKE_DATA_DIR"),
  apiKey: setting("FAKE_API_KEY"),
  appId: setting("FAKE_APP_ID"),
});
const faults = createFaults(["upload", "resume", "read", "api"]);
const admin = {
  name: "object-store",
  faults,
  lists: { objects: () => ({ objects: store.files.list() }) },
  async clear() {
    for (const { key } of store.files.list()) await store.files.remove(key);
  },
};

async function answer(call: Call): Promise<void> {
  const { request, response, url } = call;
  const { method } = request;
  const isRead = /^\/(a\/[^/]+|f)\/./.test(url.pathname);
  if (await answerAdmin(call, admin)) return;
  if (method === "OPTIONS") return sendEmpty(response, 204, corsHeaders);
  if (method === "POST" && isApi(url)) return faults.during("api", call, () => answerApi(call, store));
  if (isRead && (method === "GET" || method === "HEAD"))
    return faults.during("read", call, () => answerRead(call, store));
  // Set before anything can go wrong: a browser reads a refusal only with these.
  for (const [name, value] of Object.entries(corsHeaders)) response.setHeader(name, value);
  if (method === "HEAD") return faults.during("resume", call, () => answerResume(call, store));
  if (method === "PUT") return faults.during("upload", call, () => answerUpload(call, store));
  throw new Refusal(404, "not_found", "No such address.");
}

const server = await serveLoopback({
  name: "object store",
  host: host(),
  port: portSetting("FAKE_PORT"),
  handler: answer,
});
endOnSignals(server.close);
