import type { QuietWeek } from "@/db/schema/projects";
import { digestSubject } from "@/emails/DigestMail";
import { tokenFor } from "@/lib/auth/token";
import { appLink } from "@/lib/mail/app-link";
import type { Message } from "@/lib/mail/message";
import { createPictures } from "./digest-pictures";
import type { ProjectWeek, Span } from "./project-week";
import { renderDigest } from "./render-digest";
import { writeDigest, type Digest } from "./write-digest";

type Reader = Span & { subscriptionId: string; email: string; zone: string; quietWeek: QuietWeek };
export type DigestWriter = ReturnType<typeof createDigestWriter>;

/** Stands for the reader's own address while the mail is written once for all readers of a zone. */
const OWN_ADDRESS = "https://unsubscribe.invalid/";

type Written = { subject: string; html: string; text: string; inline: Digest["inline"]; isQuiet: boolean };

/** Writes the mails of one project. Readers of one zone and span get the same, each with an address of their own to end it. */
export function createDigestWriter(week: ProjectWeek) {
  const pictures = createPictures();
  const digests = new Map<string, Promise<Written>>();

  async function make(span: Span, zone: string): Promise<Written> {
    const { inline, ...digest } = await writeDigest(week, span, zone, pictures);
    const props = { ...digest, unsubscribeLink: OWN_ADDRESS };
    return {
      subject: digestSubject(props),
      ...(await renderDigest(props)),
      inline: digest.isQuiet ? [] : inline,
      isQuiet: digest.isQuiet,
    };
  }

  function digestFor({ since, until, zone }: Span & { zone: string }): Promise<Written> {
    const key = `${since.getTime()} ${until.getTime()} ${zone}`;
    const known = digests.get(key) ?? make({ since, until }, zone);
    digests.set(key, known);
    return known;
  }

  return {
    /** As somebody looks at it before it goes out: the address to end it is the page of one's settings. */
    async preview(span: Span, zone: string): Promise<Written> {
      const written = await digestFor({ ...span, zone });
      const own = (form: string) => form.replaceAll(OWN_ADDRESS, appLink("/settings/digest"));
      return { ...written, html: own(written.html), text: own(written.text) };
    },

    /** Undefined in a quiet week of somebody who wants no mail then. */
    async write(reader: Reader): Promise<Message | undefined> {
      const { subject, html, text, inline, isQuiet } = await digestFor(reader);
      if (isQuiet && reader.quietWeek === "nothing") return undefined;
      const way = unsubscribePaths(reader.subscriptionId);
      const own = (form: string) => form.replaceAll(OWN_ADDRESS, appLink(way.page));
      return {
        to: reader.email,
        subject,
        html: own(html),
        text: own(text),
        inline,
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
