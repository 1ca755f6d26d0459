import { existsSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { z } from "zod";
import { root } from "../run-typescript";

const accounts = z.array(z.object({ role: z.string(), email: z.string(), password: z.string(), name: z.string() }));

async function demoAccounts(): Promise<z.infer<typeof accounts>> {
  const file = join(root, "db/seed/accounts.ts");
  if (!existsSync(file)) return [];
  const loaded: { DEMO_ACCOUNTS?: unknown } = await import(pathToFileURL(file).href);
  return accounts.parse(loaded.DEMO_ACCOUNTS);
}

type Addresses = { app: string; mail: string; logs: string };

export async function printWelcome({ app, mail, logs }: Addresses): Promise<void> {
  const people = (await demoAccounts()).map(({ role, name, email, password }) => {
    return `  ${role.padEnd(13)}${name.padEnd(16)}${email.padEnd(20)}${password}`;
  });
  const lines = ["", `Boardwake      ${app}`, `Mail it sent   ${mail}`, `Logs           ${logs}`, ""];
  if (people.length > 0) lines.push("Sign in as:", ...people, "");
  console.log([...lines, "Ctrl-C stops everything; the data stays."].join("\n"));
}
