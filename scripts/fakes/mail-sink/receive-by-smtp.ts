import { SMTPServer } from "smtp-server";
import type { MessageFiles } from "./message-files";
import { summarise } from "./read-message";

const sizeLimit = 50_000_000;

class Rejected extends Error {
  constructor(
    readonly responseCode: number,
    message: string,
  ) {
    super(message);
  }
}

async function readAll(stream: AsyncIterable<Buffer | string>): Promise<Buffer> {
  const parts: Buffer[] = [];
  let size = 0;
  for await (const chunk of stream) {
    const part = Buffer.from(chunk);
    size += part.length;
    if (size <= sizeLimit) parts.push(part);
  }
  if (size > sizeLimit) throw new Rejected(552, "The message is too large.");
  return Buffer.concat(parts);
}

const asError = (error: unknown) => (error instanceof Error ? error : new Error(String(error)));

/** An SMTP server that keeps every message. `bounce@…` (also `bounce+x@…`) is refused for good, `later@…` for now. */
export function receiveBySmtp(files: MessageFiles, host: string, port: number): Promise<{ close(): void }> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["AUTH", "STARTTLS"],
    disableReverseLookup: true,
    size: sizeLimit,
    socketTimeout: 30_000,
    closeTimeout: 1_000,
    banner: "mail sink of the demo",
    onRcptTo({ address }, _, callback) {
      if (/^bounce(\+[^@]*)?@/i.test(address)) return callback(new Rejected(550, "No such mailbox."));
      if (/^later(\+[^@]*)?@/i.test(address)) return callback(new Rejected(451, "Please try again later."));
      return callback();
    },
    onData(stream, session, callback) {
      const keep = async () => {
        const source = await readAll(stream);
        const id = files.nextId();
        const to = session.envelope.rcptTo.map(({ address }) => address);
        const summary = await summarise(id, source, to);
        await files.add(summary, source);
        console.log(`kept ${id} for ${to.join(", ")}: ${summary.subject}`);
      };
      keep().then(
        () => callback(),
        (error: unknown) => callback(asError(error)),
      );
    },
  });
  server.on("error", (error: Error) => console.error(`SMTP: ${error.message}`));
  return new Promise((resolve) => {
    server.listen(port, host, () => {
      console.log(`mail sink takes mail on smtp://${host}:${port}`);
      resolve({ close: () => server.close(() => undefined) });
    });
  });
}
