import { createTransport } from "nodemailer";
import type { Accepted, AcceptedRequests, Message } from "./accepted-requests";

type Outcome = { state: Message["state"]; note?: string };

function responseCode(error: unknown): number | undefined {
  const code = typeof error === "object" && error !== null && "responseCode" in error ? error.responseCode : undefined;
  return typeof code === "number" ? code : undefined;
}

/** Hands accepted messages on by SMTP. What cannot be delivered now is tried again; what is refused has bounced. */
export function createDelivery(requests: AcceptedRequests, smtpUrl: string) {
  const { hostname, port } = new URL(smtpUrl);
  const transport = createTransport({
    host: hostname,
    port: Number(port),
    ignoreTLS: true,
    connectionTimeout: 5_000,
    socketTimeout: 15_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  const underWay = new Set<string>();

  async function send({ id, mail }: Message): Promise<Outcome> {
    try {
      await transport.sendMail({
        messageId: `<${id}@mail-service.example>`,
        from: mail.from,
        to: mail.to,
        cc: mail.cc,
        bcc: mail.bcc,
        replyTo: mail.reply_to,
        subject: mail.subject,
        html: mail.html ?? undefined,
        text: mail.text ?? undefined,
        headers: mail.headers,
        attachments: mail.attachments?.map(({ filename, content, content_type, content_id }) => {
          return { filename, content, encoding: "base64", contentType: content_type, cid: content_id };
        }),
      });
      return { state: "delivered" };
    } catch (error) {
      const code = responseCode(error);
      const note = error instanceof Error ? error.message : "unknown";
      return code !== undefined && code >= 500 ? { state: "bounced", note } : { state: "waiting", note };
    }
  }

  async function deliver(accepted: Accepted): Promise<void> {
    if (underWay.has(accepted.id)) return;
    underWay.add(accepted.id);
    try {
      for (const message of accepted.messages.filter(({ state }) => state === "waiting")) {
        Object.assign(message, await send(message));
        console.log(`message ${message.id}: ${message.state}${message.note === undefined ? "" : ` (${message.note})`}`);
        await requests.save(accepted);
        if (message.state === "waiting") return;
      }
    } finally {
      underWay.delete(accepted.id);
    }
  }

  const again = setInterval(() => requests.waiting().forEach((accepted) => void deliver(accepted)), 2000);
  requests.waiting().forEach((accepted) => void deliver(accepted));

  return {
    deliver,
    close() {
      clearInterval(again);
      transport.close();
    },
  };
}
