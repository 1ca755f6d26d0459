import { database } from "@/db/client";
import type { UserRow } from "@/db/queries/users";
import { limit } from "@/lib/http/rate-limit";
import { issueAccountToken } from "./issue-token";

/** Mails the link that confirms the address, unless that was done often enough lately. */
export async function sendConfirmation(user: Pick<UserRow, "id" | "email">): Promise<void> {
  const counted = await limit("confirm", user.email);
  if (!counted.ok) return;
  await database().transaction((tx) => issueAccountToken(tx, "confirm-address", user.id));
}
