import type { Transaction } from "@/db/client";
import { countMaintainers, findMember, lockMembers } from "@/db/queries/members";
import { reject } from "@/lib/actions/answer";

/** The member, while nobody else changes who is in the project until the transaction ends. */
export async function lockMember(tx: Transaction, projectId: string, userId: string) {
  await lockMembers(tx, projectId);
  const member = await findMember(tx, projectId, userId);
  return member ?? reject("not-found", "This person is not a member of the project any more. Reload the page.");
}

/** A project without a maintainer could never be put right again. Call it with the members locked. */
export async function keepOneMaintainer(
  tx: Transaction,
  projectId: string,
  role: string,
  sentence: string,
): Promise<void> {
  if (role === "maintainer" && (await countMaintainers(tx, projectId)) < 2) reject("blocked", sentence);
}
