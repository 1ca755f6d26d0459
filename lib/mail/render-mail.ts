import { render } from "@react-email/render";
import type { ReactElement } from "react";

/** Headings as they were written, not in capitals. */
const asWritten = { selectors: [{ selector: "h1", options: { uppercase: false } }] };

/** The two forms of a mail. */
export async function renderMail(mail: ReactElement): Promise<{ html: string; text: string }> {
  const [html, text] = await Promise.all([
    render(mail),
    render(mail, { plainText: true, htmlToTextOptions: asWritten }),
  ]);
  return { html, text };
}
