import { log } from "@/lib/http/log";

export async function mailSignInLink(to: string, _link: string, _idempotencyKey: string): Promise<void> {
  log().warn({ to }, "the mail service is not connected yet");
}
