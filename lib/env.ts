import { z } from "zod";

/** What each value should be stands in its schema, so that a missing and a malformed one are told the same. */
const should = (be: string) => ({ message: `should be ${be}` });
const text = (be: string, pattern: RegExp) => z.string(should(be)).regex(pattern, should(be));
const flag = z.enum(["0", "1"], should("0 or 1")).transform((value) => value === "1");
const address = z.url(should("an address such as https://store.example.org"));

/**
 * The one schema of the environment. Every variable stands in `.env.example` with an example.
 * A missing or malformed variable stops the start with its name and what it should be.
 */
const schema = z
  .object({
    NODE_ENV: z
      .enum(["development", "test", "production"], should("development, test or production"))
      .default("development"),
    APP_URL: z.url(should("the address people open, e.g. https://boardwake.example.org")),
    DATABASE_URL: text("a postgres:// connection string", /^postgres(ql)?:\/\//),
    DATABASE_POOL: text("a whole number from 1 to 100", /^([1-9]\d?|100)$/)
      .transform(Number)
      .default(10),
    AUTH_SECRET: text("a random text of at least 32 characters", /^.{32,}$/s),
    SIGN_UP: z.enum(["open", "invitation"], should("open or invitation")).default("open"),
    DEMO_MODE: flag.default(false),
    MAIL_TRANSPORT: z.enum(["resend", "smtp"], should("resend or smtp")),
    MAIL_FROM: text("an address such as Boardwake <bench@example.org>", /\S@\S/),
    RESEND_API_KEY: z.string().optional(),
    RESEND_BASE_URL: address.optional(),
    SMTP_URL: text("an smtp:// or smtps:// address", /^smtps?:\/\//).optional(),
    UPLOADTHING_TOKEN: text("the token of the object store", /./),
    UPLOADTHING_INGEST_URL: address.optional(),
    UPLOADTHING_API_URL: address.optional(),
    LOG_LEVEL: z
      .enum(["fatal", "error", "warn", "info", "debug", "silent"], should("fatal, error, warn, info, debug or silent"))
      .default("info"),
    TRUST_PROXY: flag.default(false),
  })
  .superRefine((value, context) => {
    if (value.MAIL_TRANSPORT === "resend" && !value.RESEND_API_KEY) {
      context.addIssue({
        code: "custom",
        path: ["RESEND_API_KEY"],
        message: "is needed when MAIL_TRANSPORT is resend",
      });
    }
    if (value.MAIL_TRANSPORT === "smtp" && !value.SMTP_URL) {
      context.addIssue({ code: "custom", path: ["SMTP_URL"], message: "is needed when MAIL_TRANSPORT is smtp" });
    }
  });

export type Env = z.output<typeof schema>;

export class EnvError extends Error {
  override name = "EnvError";
}

/** Reads the variables; throws an EnvError whose message names each variable that is wrong and what it should be. */
export function readEnv(source: Record<string, string | undefined>): Env {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ""));
  const parsed = schema.safeParse(given);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => {
    const name = issue.path.join(".");
    return given[name] === undefined ? `${name} is missing: it ${issue.message}` : `${name}: ${issue.message}`;
  });
  throw new EnvError(`The environment is not complete.\n  ${lines.join("\n  ")}\nSee .env.example.`);
}

let cached: Env | undefined;

/** The checked environment, read once on first use so that a build without secrets succeeds. */
export function env(): Env {
  cached ??= readEnv(process.env);
  return cached;
}
