import { createElement } from "react";
import { database } from "@/db/client";
import { findOpenReopening, findPersonToTell } from "@/db/queries/mails";
import { CheckReopenedMail, checkReopenedSubject } from "@/emails/CheckReopenedMail";
import { eventPayloads } from "@/lib/event/schema";
import { appLink, checkLink } from "./app-link";
import type { Message } from "./message";
import { renderMail } from "./render-mail";

/** The mail to the builder whose check was reopened; undefined when it is answered already or they want no such mail. */
export async function reopenedMail(id: string): Promise<Message | undefined> {
  const reopening = await findOpenReopening(database(), id);
  if (!reopening) return undefined;
  const person = await findPersonToTell(database(), reopening);
  if (!person) return undefined;
  const { project, serial, title, reason } = reopening;
  const recorded = eventPayloads["attempt.recorded"].safeParse(person.payload);
  const mail = createElement(CheckReopenedMail, {
    name: person.name ?? person.email,
    projectName: project.name,
    serial,
    title,
    reason,
    reopenedBy: reopening.by ?? "a maintainer",
    lastReading: recorded.success ? recorded.data.reading : "",
    link: checkLink(project.slug, serial, reopening.checkId),
    settingsLink: appLink("/settings"),
  });
  return { to: person.email, subject: checkReopenedSubject(serial, title), ...(await renderMail(mail)) };
}
