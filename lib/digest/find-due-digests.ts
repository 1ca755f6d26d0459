import { database } from "@/db/client";
import { enqueueDueProjects } from "@/db/queries/digest-deliveries";

/** Finds digests that are due, and those that a killed worker left, and enqueues one job a project. */
export async function findDueDigests(now = new Date()): Promise<void> {
  await enqueueDueProjects(database(), now);
}
