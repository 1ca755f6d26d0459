import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createTransport } from "nodemailer";
import { Resend } from "resend";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { z } from "zod";
import { secretsIn, type Secrets } from "@/scripts/fakes/secrets";
import { startFakes, type FakeUrls } from "@/scripts/fakes/start-fakes";
import { createSupervisor, type Supervisor } from "@/scripts/processes/supervisor";

const dataDir = mkdtempSync(join(tmpdir(), "boardwake-fakes-"));
let supervisor: Supervisor;
let urls: FakeUrls;
let secrets: Secrets;

beforeAll(async () => {
  supervisor = await createSupervisor({ dataDir, quiet: true });
  secrets = secretsIn(dataDir);
  urls = await startFakes({ supervisor, dataDir, secrets });
});

afterAll(async () => {
  await supervisor.stopAll();
  rmSync(dataDir, { recursive: true, force: true });
});

const order = (fake: string, query: string) => fetch(`${fake}/__fake/fail?${query}`, { method: "POST" });

describe("the mail service", () => {
  const service = () => new Resend(secrets.mailKey, { baseUrl: urls.mailService });
  const mail = (to: string, subject: string) => ({
    from: "Boardwake <bench@boardwake.example>",
    to,
    subject,
    text: "All five rails are up.",
    html: "<p>All five rails are <b>up</b>.</p>",
  });

  it("hands a message on with every header it was given", async () => {
    const headers = {
      "List-Unsubscribe": "<https://boardwake.example/u/1>",
      "List-Unsubscribe-Post": "List-Unsubscribe=One-Click",
    };
    const { data, error } = await service().emails.send({
      ...mail("ada@example.org", "This week"),
      headers,
      replyTo: "shop@example.org",
    });
    expect(error).toBeNull();
    const kept = await messageFor("ada@example.org");
    expect(kept.messageId).toBe(`<${data?.id}@mail-service.example>`);
    expect(kept.headers["list-unsubscribe"]).toBe("<https://boardwake.example/u/1>");
    expect(kept.headers["list-unsubscribe-post"]).toBe("List-Unsubscribe=One-Click");
    expect(kept.headers["reply-to"]).toBe("shop@example.org");
    expect(kept.html).toContain("<b>up</b>");
    expect(kept.text).toContain("All five rails are up.");
  });

  it("sends a batch, or nothing of it when one message is wrong", async () => {
    const right = await service().batch.send([mail("b1@example.org", "One"), mail("b2@example.org", "Two")]);
    expect(right.data?.data).toHaveLength(2);
    const wrong = await service().batch.send([mail("b3@example.org", "One"), mail("not an address", "Two")]);
    expect(wrong.error).toMatchObject({ statusCode: 422, name: "validation_error" });
    expect(await countFor("b3@example.org")).toBe(0);
  });

  it("sends once for the same key and payload, and answers the same", async () => {
    const first = await service().emails.send(mail("once@example.org", "Digest"), { idempotencyKey: "digest/1" });
    const again = await service().emails.send(mail("once@example.org", "Digest"), { idempotencyKey: "digest/1" });
    expect(again.data).toEqual(first.data);
    expect(await countFor("once@example.org")).toBe(1);
  });

  it("refuses another payload under a used key, and a key whose first request still runs", async () => {
    await service().emails.send(mail("k@example.org", "One"), { idempotencyKey: "k" });
    const other = await service().emails.send(mail("k@example.org", "Two"), { idempotencyKey: "k" });
    expect(other.error).toMatchObject({ statusCode: 409, name: "invalid_idempotent_request" });

    await order(urls.mailService, "mode=hang");
    const gaveUp = new AbortController();
    const hanging = service().emails.send(mail("h@example.org", "One"), { idempotencyKey: "h", signal: gaveUp.signal });
    await expect.poll(async () => (await waitingFaults()).length).toBe(0);
    const meanwhile = await service().emails.send(mail("h@example.org", "One"), { idempotencyKey: "h" });
    expect(meanwhile.error).toMatchObject({ statusCode: 409, name: "concurrent_idempotent_requests" });
    gaveUp.abort();
    await hanging;
    expect(await countFor("h@example.org")).toBe(0);
  });

  it("returns an ordered 500 and a 429 as error values and then goes on", async () => {
    await order(urls.mailService, "mode=500&count=1");
    expect((await service().emails.send(mail("f@example.org", "One"))).error).toMatchObject({
      statusCode: 500,
      name: "application_error",
    });
    await order(urls.mailService, "mode=429&count=1");
    expect((await service().emails.send(mail("f@example.org", "One"))).error).toMatchObject({
      statusCode: 429,
      name: "rate_limit_exceeded",
    });
    expect((await service().emails.send(mail("f@example.org", "One"))).error).toBeNull();
  });

  it("sends once when its answer was lost and the caller tries again with the same key", async () => {
    await order(urls.mailService, "mode=lost");
    const lost = await service().emails.send(mail("lost@example.org", "One"), { idempotencyKey: "lost" });
    expect(lost.data).toBeNull();
    const again = await service().emails.send(mail("lost@example.org", "One"), { idempotencyKey: "lost" });
    expect(again.error).toBeNull();
    expect(await countFor("lost@example.org")).toBe(1);
  });

  it("says what is missing, and refuses a wrong key", async () => {
    const { text: _text, html: _html, ...empty } = mail("e@example.org", "One");
    const missing = await service().emails.send({ ...empty, text: "" });
    expect(missing.error).toMatchObject({ statusCode: 422, name: "missing_required_field" });
    const stranger = await new Resend("re_wrong", { baseUrl: urls.mailService }).emails.send(
      mail("e@example.org", "One"),
    );
    expect(stranger.error).toMatchObject({ name: "invalid_api_key" });
  });

  it("accepts a message to a mailbox that is gone and reports that it bounced", async () => {
    const { data } = await service().emails.send(mail("bounce@example.org", "One"));
    const found = await service().emails.get(data?.id ?? "");
    expect(found.data?.last_event).toBe("bounced");
  });

  async function waitingFaults(): Promise<unknown[]> {
    const answer = await fetch(`${urls.mailService}/__fake/fail`);
    return z.object({ waiting: z.array(z.unknown()) }).parse(await answer.json()).waiting;
  }
});

describe("the mail sink", () => {
  it("keeps a message's headers, text and files as they came, and blind copies in the envelope", async () => {
    const transport = createTransport(urls.smtp, { from: "bench@boardwake.example" });
    await transport.sendMail({
      to: "eve@example.org",
      bcc: "blind@example.org",
      subject: "Größe – ✓",
      text: "5 V ± 5 %",
      headers: { "X-Unit": "A-001" },
      attachments: [{ filename: "trace.csv", content: "0,1\n" }],
    });
    const kept = await messageFor("blind@example.org");
    expect(kept.subject).toBe("Größe – ✓");
    expect(kept.headers["x-unit"]).toBe("A-001");
    expect(kept.to).toEqual(["eve@example.org", "blind@example.org"]);
    expect(kept.attachments).toMatchObject([{ filename: "trace.csv", size: 4 }]);
    expect(kept.headers["bcc"]).toBeUndefined();
  });

  it("shows a message's HTML only inside a sandbox", async () => {
    const [newest] = await list();
    const page = await fetch(`${urls.mailSink}/messages/${newest?.id}/html`);
    expect(page.headers.get("content-security-policy")).toMatch(/^sandbox [^;]*; default-src 'none'/);
    expect(page.headers.get("content-security-policy")).not.toContain("allow-scripts");
  });

  it("refuses a mailbox that does not exist", async () => {
    const transport = createTransport(urls.smtp);
    const refused = transport.sendMail({ from: "bench@boardwake.example", to: "bounce@example.org", text: "?" });
    await expect(refused).rejects.toThrow(/550/);
  });

  it("forgets everything when told to", async () => {
    expect((await list()).length).toBeGreaterThan(0);
    await fetch(`${urls.mailSink}/api/messages`, { method: "DELETE" });
    expect(await list()).toEqual([]);
  });
});

const listSchema = z.array(z.object({ id: z.string(), to: z.array(z.string()) }));
const messageSchema = z.object({
  messageId: z.string().nullable(),
  subject: z.string(),
  to: z.array(z.string()),
  html: z.string().nullable(),
  text: z.string(),
  headers: z.record(z.string(), z.string()),
  attachments: z.array(z.object({ filename: z.string(), size: z.number() })),
});

async function list(to?: string) {
  const query = to === undefined ? "" : `?to=${encodeURIComponent(to)}`;
  return listSchema.parse(await (await fetch(`${urls.mailSink}/api/messages${query}`)).json());
}

const countFor = async (to: string) => (await list(to)).length;

async function messageFor(to: string) {
  const [newest] = await list(to);
  return messageSchema.parse(await (await fetch(`${urls.mailSink}/api/messages/${newest?.id}`)).json());
}
