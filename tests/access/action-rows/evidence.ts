import { eq } from "drizzle-orm";
import { database } from "@/db/client";
import { attachments, logEntries } from "@/db/schema/evidence";
import { makeEvidence } from "../../support/project";
import { makeLogEntry } from "../machine";
import type { Rows } from "./row";

const form = { title: "Second light", body: "It ran for an hour.", unit: "TIM-01", pictures: [] };

export const evidenceRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/evidence/actions.ts": {
    captionEvidence: {
      permission: "evidence.attach",
      input: async (machine) => ({ attachmentId: await makeEvidence(machine), caption: "Solder side" }),
    },
    removeEvidence: {
      permission: "evidence.attach",
      input: async (machine) => ({ attachmentId: await makeEvidence(machine) }),
    },
    restoreEvidence: {
      permission: "evidence.attach",
      input: async (machine) => {
        const attachmentId = await makeEvidence(machine);
        await database().update(attachments).set({ archivedAt: new Date() }).where(eq(attachments.id, attachmentId));
        return { attachmentId };
      },
    },
  },
  "app/(workshop)/projects/[project]/log/actions.ts": {
    writeEntry: { permission: "log.write", input: () => form },
    editEntry: {
      permission: "log.write",
      input: async (machine) => ({ ...form, entryId: await makeLogEntry(machine), version: 1 }),
    },
    archiveEntry: { permission: "log.write", input: async (machine) => ({ entryId: await makeLogEntry(machine) }) },
    restoreEntry: {
      permission: "log.write",
      input: async (machine) => {
        const entryId = await makeLogEntry(machine);
        await database().update(logEntries).set({ archivedAt: new Date() }).where(eq(logEntries.id, entryId));
        return { entryId };
      },
    },
  },
};
