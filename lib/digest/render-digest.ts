import { render } from "@react-email/render";
import { createElement } from "react";
import { digestText } from "@/emails/digest-text";
import { DigestMail } from "@/emails/DigestMail";
import type { DigestMailProps } from "@/emails/parts/digest-mail-props";

/** Both forms. The empty marks between pieces of text are only of use to a page that comes alive; a mail never does. */
export async function renderDigest(props: DigestMailProps): Promise<{ html: string; text: string }> {
  const html = await render(createElement(DigestMail, props));
  return { html: html.replaceAll("<!-- -->", ""), text: digestText(props) };
}
