import { join } from "node:path";
import { freePort } from "../processes/free-port";
import type { Supervisor } from "../processes/supervisor";
import { waitForHttp } from "../processes/wait-until";
import type { Secrets } from "./secrets";

/** Preferred ports; the next free one is taken when one is in use. */
export type FakePorts = { objectStore: number; mailService: number; mailSink: number; smtp: number };
export type FakeUrls = { objectStore: string; mailService: string; mailSink: string; smtp: string };

type Options = { supervisor: Supervisor; dataDir: string; secrets: Secrets; ports?: Partial<FakePorts> };

/** Loads TypeScript whatever the folder is that the process starts in. */
const loader = ["--import", import.meta.resolve("tsx")];

async function startFake(
  supervisor: Supervisor,
  name: string,
  port: number,
  env: Record<string, string>,
): Promise<void> {
  const child = supervisor.start({
    name,
    command: process.execPath,
    args: [...loader, join(import.meta.dirname, `${name}.ts`)],
    env: { ...env, FAKE_PORT: String(port), FAKE_HOST: "127.0.0.1" },
    graceMs: 3000,
  });
  await waitForHttp(child, `http://127.0.0.1:${port}/__fake/health`);
}

/** Starts the three stand-ins as processes of their own and waits until each answers. */
export async function startFakes({ supervisor, dataDir, secrets, ports = {} }: Options): Promise<FakeUrls> {
  const store = await freePort(ports.objectStore);
  const mail = await freePort(ports.mailService);
  const sink = await freePort(ports.mailSink);
  const smtp = await freePort(ports.smtp);
  const smtpUrl = `smtp://127.0.0.1:${smtp}`;
  const folder = (name: string) => ({ FAKE_DATA_DIR: join(dataDir, name) });
  const storeEnv = { ...folder("object-store"), FAKE_API_KEY: secrets.storeKey, FAKE_APP_ID: secrets.appId };
  const mailEnv = { ...folder("mail-service"), FAKE_API_KEY: secrets.mailKey, FAKE_SMTP_URL: smtpUrl };
  await Promise.all([
    startFake(supervisor, "object-store", store, storeEnv),
    startFake(supervisor, "mail-sink", sink, { ...folder("mail-sink"), FAKE_SMTP_PORT: String(smtp) }),
    startFake(supervisor, "mail-service", mail, mailEnv),
  ]);
  return {
    // The name and not the number: the SDK reads by http only from a host whose name contains "local".
    objectStore: `http://localhost:${store}`,
    mailService: `http://127.0.0.1:${mail}`,
    mailSink: `http://localhost:${sink}`,
    smtp: smtpUrl,
  };
}

/** What the UploadThing SDK has to be told to talk to the stand-in. */
export function storeEnvironment(urls: FakeUrls, secrets: Secrets): Record<string, string> {
  const token = { apiKey: secrets.storeKey, appId: secrets.appId, regions: ["local"] };
  return {
    UPLOADTHING_TOKEN: Buffer.from(JSON.stringify(token)).toString("base64"),
    UPLOADTHING_INGEST_URL: urls.objectStore,
    UPLOADTHING_API_URL: urls.objectStore,
    UPLOADTHING_UFS_HOST: new URL(urls.objectStore).host,
    UPLOADTHING_UFS_APP_ID_LOCATION: "path",
    UPLOADTHING_IS_DEV: "false",
    UPLOADTHING_LOG_LEVEL: "Warning",
  };
}
