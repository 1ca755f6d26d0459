import { DEMO_ACCOUNTS, type DemoAccount } from "@/db/seed/accounts";
import { env } from "@/lib/env";

/** The demo's accounts with their passwords, in demo mode; otherwise nobody. */
export function loadDemoAccounts(): readonly DemoAccount[] {
  return env().DEMO_MODE ? DEMO_ACCOUNTS : [];
}
