import { render } from "@react-email/render";
import type { ReactElement } from "react";

/** The two forms of a mail. */
export async function renderMail(mail: ReactElement): Promise<{ html: string; text: string }> {
  const [html, text] = await Promise.all([render(mail), render(mail, { plainText: true })]);
  return { html, text };
}
