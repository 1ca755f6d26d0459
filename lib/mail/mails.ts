import type { JobPayload } from "@/lib/jobs/payloads";
import { accountMail } from "./account-mail";
import { invitationMail } from "./invitation-mail";
import type { Message } from "./message";
import { reopenedMail } from "./reopened-mail";

type Kind = JobPayload<"send-mail">["kind"];

const WRITERS: Record<Kind, (id: string) => Promise<Message | undefined>> = {
  "confirm-address": accountMail,
  "reset-password": accountMail,
  invitation: invitationMail,
  "check-reopened": reopenedMail,
};

/**
 * Writes the mail of a row from its id. Undefined when there is nothing to say any more. Tokens are derived here from
 * the id and the installation's secret; neither the job nor the database holds one.
 */
export function mailFor({ kind, id }: JobPayload<"send-mail">): Promise<Message | undefined> {
  return WRITERS[kind](id);
}
