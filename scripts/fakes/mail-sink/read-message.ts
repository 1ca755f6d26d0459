import { simpleParser, type AddressObject, type ParsedMail } from "mailparser";
import type { Summary } from "./message-files";

const attachmentsOf = (mail: ParsedMail) => {
  return mail.attachments.map(({ filename, contentType, size }, index) => {
    return { filename: filename ?? `part-${index + 1}`, contentType, size };
  });
};

/** keepCidLinks: pictures inside the message are served by this program, not put into the page. */
export const parseSource = (source: Buffer) => simpleParser(source, { keepCidLinks: true });

export async function summarise(id: string, source: Buffer, to: string[]): Promise<Summary> {
  const mail = await parseSource(source);
  return {
    id,
    from: mail.from?.text ?? "",
    to,
    subject: mail.subject ?? "",
    messageId: mail.messageId ?? null,
    receivedAt: new Date().toISOString(),
    size: source.length,
    attachments: attachmentsOf(mail),
  };
}

/** The header lines as sent, unfolded, in their order. */
function headersOf(mail: ParsedMail): { name: string; value: string }[] {
  return mail.headerLines.map(({ line }) => {
    const colon = line.indexOf(":");
    return {
      name: line.slice(0, colon),
      value: line
        .slice(colon + 1)
        .replace(/\r?\n\s*/g, " ")
        .trim(),
    };
  });
}

function linksOf(html: string, text: string): string[] {
  const inHtml = [...html.matchAll(/href="(https?:[^"]+)"/g)].map(([, link = ""]) => link.replaceAll("&amp;", "&"));
  const inText = [...text.matchAll(/https?:\/\/[^\s<>"')\]]+/g)].map(([link]) => link);
  return [...new Set([...inHtml, ...inText])];
}

const textOf = (address: AddressObject | AddressObject[] | undefined) => [address ?? []].flat().map((one) => one.text);

export async function readMessage(summary: Summary, source: Buffer) {
  const mail = await parseSource(source);
  const html = typeof mail.html === "string" ? mail.html : null;
  const text = mail.text ?? "";
  const headerLines = headersOf(mail);
  return {
    ...summary,
    html,
    text,
    replyTo: textOf(mail.replyTo),
    /** By lower-case name; a header that comes twice keeps its last value here and both in headerLines. */
    headers: Object.fromEntries(headerLines.map(({ name, value }) => [name.toLowerCase(), value])),
    headerLines,
    links: linksOf(html ?? "", text),
  };
}

export type Message = Awaited<ReturnType<typeof readMessage>>;
