import type { Task, TaskList } from "graphile-worker";
import { makeThumbnails } from "@/lib/attachment/make-thumbnails";
import { findDueDigests } from "@/lib/digest/find-due-digests";
import { sendProjectDigests } from "@/lib/digest/send-project-digests";
import { log } from "@/lib/http/log";
import { sendQueuedMail } from "@/lib/mail/send-queued-mail";
import { jobPayloads, type JobName, type JobPayload } from "./payloads";
import { releaseStuckJobs } from "./release-stuck-jobs";
import { sweep } from "./sweep";

type Work<Name extends JobName> = (
  payload: JobPayload<Name>,
  job: { id: string; signal: AbortSignal },
) => Promise<void>;

/** A payload that its schema does not know is logged and dropped: trying it again would not help. */
function task<Name extends JobName>(name: Name, work: Work<Name>): Task {
  return async (raw, helpers) => {
    const payload = jobPayloads[name].safeParse(raw);
    if (!payload.success) return log().error({ name, jobId: helpers.job.id }, "the payload of a job is not valid");
    // The schema of this name has just read it; the compiler cannot follow the correlation.
    await work(payload.data as JobPayload<Name>, { id: helpers.job.id, signal: helpers.abortSignal });
  };
}

/** Everything that the worker does. Each may run twice or be cut off anywhere: none leaves anything half done. */
export const TASKS = {
  "make-thumbnails": task("make-thumbnails", makeThumbnails),
  "send-mail": task("send-mail", (payload, { id }) => sendQueuedMail(payload, id)),
  "find-due-digests": task("find-due-digests", async () => {
    await findDueDigests();
    await releaseStuckJobs();
  }),
  "send-project-digests": task("send-project-digests", ({ projectId }, { signal }) =>
    sendProjectDigests({ projectId, signal }),
  ),
  sweep: task("sweep", sweep),
} satisfies Record<JobName, Task> satisfies TaskList;

/** Minute, hour, day, month, weekday; what was missed while no worker ran is made up for, once. */
export const CRON = [
  "*/5 * * * * find-due-digests ?fill=10m&jobKey=find-due-digests&max=3",
  "17 * * * * sweep ?fill=2h&jobKey=sweep&max=3",
].join("\n");
