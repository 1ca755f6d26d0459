import { render } from "@react-email/render";
import { createElement } from "react";
import type { QuietWeek } from "@/db/schema/projects";
import { digestText } from "@/emails/digest-text";
import { DigestMail, digestSubject } from "@/emails/DigestMail";
import { tokenFor } from "@/lib/auth/token";
import { appLink } from "@/lib/mail/app-link";
import type { Message } from "@/lib/mail/message";
import { createPictures } from "./digest-pictures";
import type { ProjectWeek, Span } from "./project-week";
import { writeDigest, type Digest } from "./write-digest";

type Reader = Span & { subscriptionId: string; email: string; zone: string; quietWeek: QuietWeek };
export type DigestWriter = ReturnType<typeof createDigestWriter>;

/** Writes the mails of one project. What readers of one zone and span have in common is put together once. */
export function createDigestWriter(week: ProjectWeek) {
  const pictures = createPictures();
  const digests = new Map<string, Promise<Digest>>();

  function digestFor({ since, until, zone }: Span & { zone: string }): Promise<Digest> {
    const key = `${since.getTime()} ${until.getTime()} ${zone}`;
    const known = digests.get(key) ?? writeDigest(week, { since, until }, zone, pictures);
    digests.set(key, known);
    return known;
  }

  return {
    /** Undefined in a quiet week of somebody who wants no mail then. */
    async write(reader: Reader): Promise<Message | undefined> {
      const { inline, ...digest } = await digestFor(reader);
      if (digest.isQuiet && reader.quietWeek === "nothing") return undefined;
      const way = unsubscribePaths(reader.subscriptionId);
      const props = { ...digest, unsubscribeLink: appLink(way.page) };
      return {
        to: reader.email,
        subject: digestSubject(props),
        html: await render(createElement(DigestMail, props)),
        text: digestText(props),
        inline: digest.isQuiet ? [] : inline,
        // RFC 8058: one address, no other way, and nothing but the press in the body.
        headers: {
          "List-Unsubscribe": `<${appLink(way.oneClick)}>`,
          "List-Unsubscribe-Post": "List-Unsubscribe=One-Click",
        },
      };
    },
  };
}

export function unsubscribePaths(subscriptionId: string) {
  const tail = `${subscriptionId}/${tokenFor("unsubscribe", subscriptionId)}`;
  return { page: `/unsubscribe/${tail}`, oneClick: `/api/unsubscribe/${tail}` };
}
