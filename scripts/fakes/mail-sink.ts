import { join } from "node:path";
import { answerAdmin } from "./http/admin";
import { createFaults } from "./http/faults";
import { Refusal } from "./http/refusal";
import { serveLoopback, type Call } from "./http/serve-loopback";
import { answerApi, answerPages } from "./mail-sink/answer-pages";
import { openMessageFiles } from "./mail-sink/message-files";
import { receiveBySmtp } from "./mail-sink/receive-by-smtp";
import { endOnSignals, host, portSetting, setting } from "./settings";

// Takes mail by SMTP, keeps every message and shows it: nothing ever leaves this machine.
const files = await openMessageFiles(join(setting("FAKE_DATA_DIR"), "messages"));
const admin = { name: "mail-sink", faults: createFaults([]), lists: {}, clear: () => files.clear() };

async function answer(call: Call): Promise<void> {
  if (await answerAdmin(call, admin)) return;
  if (await answerApi(call, files)) return;
  if (await answerPages(call, files)) return;
  throw new Refusal(404, "not_found", "No such address.");
}

const smtp = await receiveBySmtp(files, host(), portSetting("FAKE_SMTP_PORT"));
const server = await serveLoopback({
  name: "mail sink",
  host: host(),
  port: portSetting("FAKE_PORT"),
  handler: answer,
});
endOnSignals(() => {
  server.close();
  smtp.close();
});
