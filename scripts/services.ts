import { mkdirSync } from "node:fs";
import { resolve } from "node:path";
import { secretsIn, type Secrets } from "./fakes/secrets";
import { startFakes, storeEnvironment, type FakePorts, type FakeUrls } from "./fakes/start-fakes";
import { startPostgres } from "./postgres/start-postgres";
import { createSupervisor, type Supervisor } from "./processes/supervisor";

/** Preferred ports; the next free one is taken when one is in use. Without a preference any free port. */
type Ports = FakePorts & { postgres: number };

type Options = { dataDir: string; ports?: Partial<Ports>; fsync: boolean; quiet: boolean };
type Urls = FakeUrls & { database: string };

export type Services = {
  /** Everything the app needs but APP_URL, which is the caller's. */
  env: Record<string, string>;
  urls: Urls;
  supervisor: Supervisor;
  stop(): Promise<void>;
};

function environment(urls: Urls, secrets: Secrets): Record<string, string> {
  return {
    DATABASE_URL: urls.database,
    AUTH_SECRET: secrets.authSecret,
    ...storeEnvironment(urls, secrets),
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
    const { ports, fsync } = options;
    const [{ url: database }, fakes] = await Promise.all([
      startPostgres({ supervisor, dataDir, port: ports?.postgres, fsync }),
      startFakes({ supervisor, dataDir, secrets, ports }),
    ]);
    const urls = { database, ...fakes };
    return { env: environment(urls, secrets), urls, supervisor, stop: () => supervisor.stopAll() };
  } catch (error) {
    await supervisor.stopAll();
    throw error;
  }
}
