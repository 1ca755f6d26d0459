import { randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join, resolve } from "node:path";
import { z } from "zod";
import { startPostgres } from "./postgres/start-postgres";
import { freePort } from "./processes/free-port";
import { createSupervisor, type Supervisor } from "./processes/supervisor";
import { waitForHttp } from "./processes/wait-until";

/** Preferred ports; the next free one is taken when one is in use. Without a preference any free port. */
export type Ports = { postgres: number; objectStore: number; mailService: number; mailSink: number; smtp: number };

type Options = { dataDir: string; ports?: Partial<Ports>; fsync: boolean; quiet: boolean };

export type Services = {
  env: Record<string, string>;
  urls: { database: string; objectStore: string; mailService: string; mailSink: string; smtp: string };
  supervisor: Supervisor;
  stop(): Promise<void>;
};

const secretsSchema = z.object({
  authSecret: z.string(),
  storeKey: z.string(),
  appId: z.string(),
  mailKey: z.string(),
});
type Secrets = z.infer<typeof secretsSchema>;

const random = (bytes: number) => randomBytes(bytes).toString("hex");

/** Made once and kept, so that sessions and stored files outlive a restart. */
function secretsIn(dataDir: string): Secrets {
  const file = join(dataDir, "secrets.json");
  if (existsSync(file)) return secretsSchema.parse(JSON.parse(readFileSync(file, "utf8")));
  const secrets = {
    authSecret: random(32),
    storeKey: `sk_fake_${random(24)}`,
    appId: `fake${random(5)}`,
    mailKey: `re_fake_${random(16)}`,
  };
  mkdirSync(dataDir, { recursive: true });
  writeFileSync(file, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  return secrets;
}

/** Loads TypeScript whatever the folder is that the process starts in. */
const loader = ["--import", import.meta.resolve("tsx")];
const fake = (file: string) => [...loader, join(import.meta.dirname, "fakes", file)];

async function startFake(
  supervisor: Supervisor,
  name: string,
  port: number,
  env: Record<string, string>,
): Promise<void> {
  const child = supervisor.start({
    name,
    command: process.execPath,
    args: fake(`${name}.ts`),
    env: { ...env, FAKE_PORT: String(port), FAKE_HOST: "127.0.0.1" },
    graceMs: 3000,
  });
  await waitForHttp(child, `http://127.0.0.1:${port}/__fake/health`);
}

async function startFakes(supervisor: Supervisor, dataDir: string, secrets: Secrets, wanted: Partial<Ports>) {
  const store = await freePort(wanted.objectStore);
  const mail = await freePort(wanted.mailService);
  const sink = await freePort(wanted.mailSink);
  const smtp = await freePort(wanted.smtp);
  const smtpUrl = `smtp://127.0.0.1:${smtp}`;
  const folder = (name: string) => ({ FAKE_DATA_DIR: join(dataDir, name) });
  await Promise.all([
    startFake(supervisor, "object-store", store, {
      ...folder("object-store"),
      FAKE_API_KEY: secrets.storeKey,
      FAKE_APP_ID: secrets.appId,
    }),
    startFake(supervisor, "mail-sink", sink, { ...folder("mail-sink"), FAKE_SMTP_PORT: String(smtp) }),
    startFake(supervisor, "mail-service", mail, {
      ...folder("mail-service"),
      FAKE_API_KEY: secrets.mailKey,
      FAKE_SMTP_URL: smtpUrl,
    }),
  ]);
  return {
    // The name and not the number: the SDK reads by http only from a host whose name contains "local".
    objectStore: `http://localhost:${store}`,
    mailService: `http://127.0.0.1:${mail}`,
    mailSink: `http://localhost:${sink}`,
    smtp: smtpUrl,
  };
}

function environment(urls: Services["urls"], secrets: Secrets): Record<string, string> {
  const token = { apiKey: secrets.storeKey, appId: secrets.appId, regions: ["local"] };
  return {
    DATABASE_URL: urls.database,
    AUTH_SECRET: secrets.authSecret,
    UPLOADTHING_TOKEN: Buffer.from(JSON.stringify(token)).toString("base64"),
    UPLOADTHING_INGEST_URL: urls.objectStore,
    UPLOADTHING_API_URL: urls.objectStore,
    UPLOADTHING_UFS_HOST: new URL(urls.objectStore).host,
    UPLOADTHING_UFS_APP_ID_LOCATION: "path",
    UPLOADTHING_IS_DEV: "false",
    UPLOADTHING_LOG_LEVEL: "Warning",
    MAIL_TRANSPORT: "resend",
    MAIL_FROM: "Boardwake <bench@boardwake.example>",
    RESEND_API_KEY: secrets.mailKey,
    RESEND_BASE_URL: urls.mailService,
    SMTP_URL: urls.smtp,
    SIGN_UP: "open",
    DEMO_MODE: "0",
    LOG_LEVEL: "info",
    NEXT_TELEMETRY_DISABLED: "1",
    // For tests and people; the app reads none of these.
    FAKE_OBJECT_STORE_URL: urls.objectStore,
    FAKE_MAIL_SERVICE_URL: urls.mailService,
    FAKE_MAIL_SINK_URL: urls.mailSink,
  };
}

/** Starts PostgreSQL and the fakes in one data folder and returns the environment that the app needs for them. */
export async function startServices(options: Options): Promise<Services> {
  const dataDir = resolve(options.dataDir);
  mkdirSync(dataDir, { recursive: true });
  const supervisor = await createSupervisor({ dataDir, quiet: options.quiet });
  try {
    const secrets = secretsIn(dataDir);
    const { ports = {}, fsync } = options;
    const [{ url: database }, fakes] = await Promise.all([
      startPostgres({ supervisor, dataDir, port: ports.postgres, fsync }),
      startFakes(supervisor, dataDir, secrets, ports),
    ]);
    const urls = { database, ...fakes };
    return { env: environment(urls, secrets), urls, supervisor, stop: () => supervisor.stopAll() };
  } catch (error) {
    await supervisor.stopAll();
    throw error;
  }
}
