import { database } from "@/db/client";
import { findRecentDeliveries, findSubscribers } from "@/db/queries/digest-overview";
import type { ProjectScope } from "@/lib/access/scope";
import { createDigestWriter } from "./digest-writer";
import { loadProjectWeek } from "./project-week";

const WEEK_MS = 7 * 86_400_000;

/** This week's e-mail as it would go out now, in the viewer's zone. */
export async function writePreview(scope: ProjectScope, now = new Date()) {
  const span = { since: new Date(now.getTime() - WEEK_MS), until: now };
  const week = await loadProjectWeek(scope.projectId, span);
  return week && createDigestWriter(week).preview(span, scope.viewer.timeZone);
}

/** The preview with its pictures in it, who gets the real ones and what became of the last ones. */
export async function loadPreview(scope: ProjectScope) {
  const db = database();
  const [written, subscribers, deliveries] = await Promise.all([
    writePreview(scope),
    findSubscribers(db, scope),
    findRecentDeliveries(db, scope),
  ]);
  const inline = written?.inline ?? [];
  const html = inline.reduce(
    (page, picture) =>
      page.replaceAll(
        `cid:${picture.contentId}`,
        `data:${picture.mediaType};base64,${picture.content.toString("base64")}`,
      ),
    written?.html ?? "",
  );
  return { subject: written?.subject ?? "", html, text: written?.text ?? "", subscribers, deliveries };
}
