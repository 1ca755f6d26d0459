import { randomBytes } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { z } from "zod";

const secretsSchema = z.object({
  authSecret: z.string(),
  storeKey: z.string(),
  appId: z.string(),
  mailKey: z.string(),
});
export type Secrets = z.infer<typeof secretsSchema>;

const random = (bytes: number) => randomBytes(bytes).toString("hex");

/** Made once and kept, so that sessions and stored files outlive a restart. */
export function secretsIn(dataDir: string): Secrets {
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
