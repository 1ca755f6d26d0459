import { html, type Html } from "./html";
import type { Summary } from "./message-files";
import type { Message } from "./read-message";
import { style } from "./style";

function page(title: string, body: Html, refreshSeconds?: number): string {
  const refresh =
    refreshSeconds === undefined ? undefined : html`<meta http-equiv="refresh" content="${refreshSeconds}" />`;
  const head = html`<meta charset="utf-8" /><meta
      name="viewport"
      content="width=device-width, initial-scale=1"
    />${refresh}<title>${title}</title>`;
  return `<!doctype html><html lang="en"><head>${head.text}<style>${style}</style></head><body>${body.text}</body></html>`;
}

const time = (iso: string) => html`<time datetime="${iso}">${iso.slice(0, 19).replace("T", " ")}</time>`;

const row = ({ id, to, subject, receivedAt, attachments }: Summary) =>
  html` <tr>
    <td>${time(receivedAt)}</td>
    <td>${to.join(", ")}</td>
    <td><a href="/messages/${id}">${subject === "" ? "(no subject)" : subject}</a></td>
    <td>${attachments.length === 0 ? "" : `${attachments.length} attached`}</td>
  </tr>`;

export function listPage(messages: Summary[]): string {
  const table = html`<table>
    <thead>
      <tr>
        <th>Received (UTC)</th>
        <th>To</th>
        <th>Subject</th>
        <th>Files</th>
      </tr>
    </thead>
    <tbody>
      ${messages.map(row)}
    </tbody>
  </table>`;
  const empty = html`<p>No mail yet. What the app sends shows up here within seconds.</p>`;
  const body = html`<h1>Mail that would have left</h1>
    <p>Kept on this machine only, newest first.</p>
    ${messages.length === 0 ? empty : table}`;
  return page("Mail", body, 5);
}

const views = ["html", "text", "headers", "source"] as const;
export type View = (typeof views)[number];

export const readView = (given: string | null): View | undefined => views.find((view) => view === given);

const headerRow = ({ name, value }: { name: string; value: string }) =>
  html`<tr>
    <th scope="row">${name}</th>
    <td class="mono">${value}</td>
  </tr>`;

function content(message: Message, view: View, source: string): Html {
  switch (view) {
    case "html":
      return html`<iframe
        title="The message"
        src="/messages/${message.id}/html"
        sandbox="allow-popups allow-popups-to-escape-sandbox"
      ></iframe>`;
    case "text":
      return html`<pre>${message.text}</pre>`;
    case "headers":
      return html`<table>
        <tbody>
          ${message.headerLines.map(headerRow)}
        </tbody>
      </table>`;
    case "source":
      return html`<pre>${source.slice(0, 400_000)}</pre>`;
  }
}

function files({ id, attachments }: Message): Html | undefined {
  if (attachments.length === 0) return undefined;
  const entries = attachments.map(({ filename, contentType, size }, index) => {
    return html`<li><a href="/messages/${id}/attachments/${index}">${filename}</a> ${contentType}, ${size} bytes</li>`;
  });
  return html`<h2>Attached</h2>
    <ul>
      ${entries}
    </ul>`;
}

function links({ links }: Message): Html | undefined {
  if (links.length === 0) return undefined;
  return html`<h2>Links in this message</h2>
    <ul>
      ${links.map((link) => html`<li><a href="${link}" rel="noreferrer">${link}</a></li>`)}
    </ul>`;
}

export function messagePage(message: Message, wanted: View | undefined, source: string): string {
  const possible = views.filter((view) => view !== "html" || message.html !== null);
  const view = possible.find((one) => one === wanted) ?? possible[0] ?? "text";
  const tabs = possible.map(
    (one) => html`<a href="?view=${one}" ${one === view ? html`aria-current="page"` : ""}>${one}</a>`,
  );
  const body = html`<a href="/">All mail</a>
    <h1>${message.subject === "" ? "(no subject)" : message.subject}</h1>
    <p>From ${message.from} to ${message.to.join(", ")}, ${time(message.receivedAt)}</p>
    <nav aria-label="Views of the message">${tabs}</nav>
    ${content(message, view, source)} ${files(message)} ${links(message)}`;
  return page(message.subject, body);
}
