import { z } from "zod";

const mailAddress = z.string().min(3, "should be an address such as Boardwake <bench@example.org>");
const flag = z.enum(["0", "1"]).transform((value) => value === "1");

/**
 * The one schema of the environment. Every variable stands in `.env.example` with an example.
 * A missing or malformed variable stops the start with its name and what it should be.
 */
const schema = z
  .object({
    NODE_ENV: z.enum(["development", "test", "production"]).default("development"),
    APP_URL: z.url({ message: "should be the address people open, e.g. https://boardwake.example.org" }),
    DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, "should be a postgres:// connection string"),
    DATABASE_POOL: z.coerce.number().int().min(1).max(100).default(10),
    AUTH_SECRET: z.string().min(32, "should be a random text of at least 32 characters"),
    SIGN_UP: z.enum(["open", "invitation"], { message: "should be open or invitation" }).default("open"),
    DEMO_MODE: flag.default(false),
    MAIL_TRANSPORT: z.enum(["resend", "smtp"], { message: "should be resend or smtp" }),
    MAIL_FROM: mailAddress,
    RESEND_API_KEY: z.string().optional(),
    RESEND_BASE_URL: z.url().optional(),
    SMTP_URL: z
      .string()
      .regex(/^smtps?:\/\//, "should be an smtp:// or smtps:// address")
      .optional(),
    UPLOADTHING_TOKEN: z.string().min(1, "should be the token of the object store"),
    UPLOADTHING_INGEST_URL: z.url().optional(),
    UPLOADTHING_API_URL: z.url().optional(),
    LOG_LEVEL: z.enum(["fatal", "error", "warn", "info", "debug", "silent"]).default("info"),
    TRUST_PROXY: flag.default(false),
  })
  .superRefine((value, context) => {
    if (value.MAIL_TRANSPORT === "resend" && !value.RESEND_API_KEY) {
      context.addIssue({ code: "custom", path: ["RESEND_API_KEY"], message: "is needed when MAIL_TRANSPORT is resend" });
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
