import { mkdtempSync, rmSync } from "node:fs";
import { createServer, type Server } from "node:http";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createRouteHandler, createUploadthing, UploadThingError } from "uploadthing/server";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { z } from "zod";
import { secretsIn } from "@/scripts/fakes/secrets";
import { startFakes, storeEnvironment, type FakeUrls } from "@/scripts/fakes/start-fakes";
import { freePort } from "@/scripts/processes/free-port";
import { createSupervisor, type Supervisor } from "@/scripts/processes/supervisor";

const dataDir = mkdtempSync(join(tmpdir(), "boardwake-callback-"));
let supervisor: Supervisor;
let urls: FakeUrls;
let app: Server;
let appUrl: string;
const failed: string[] = [];

/** An app of two upload routes, answering as Next.js would. */
function startApp(port: number, env: Record<string, string>): Promise<Server> {
  const route = createUploadthing();
  const blob = { blob: { maxFileSize: "1MB", acl: "private" } } as const;
  const router = {
    evidence: route(blob)
      .middleware(({ req }) => {
        if (req.headers.get("x-may") !== "yes")
          throw new UploadThingError({ code: "FORBIDDEN", message: "Not for you." });
        return { unit: "A-001" };
      })
      .onUploadError(({ fileKey }) => void failed.push(fileKey))
      .onUploadComplete(({ metadata, file }) => ({ unit: metadata.unit, name: file.name })),
    broken: route(blob).onUploadComplete(() => {
      throw new Error("the database is gone");
    }),
  };
  const config = {
    token: env["UPLOADTHING_TOKEN"],
    ingestUrl: urls.objectStore,
    isDev: false,
    logLevel: "None",
    handleDaemonPromise: "await",
  } as const;
  const handle = createRouteHandler({ router, config });
  const server = createServer(async (request, response) => {
    const parts: Buffer[] = [];
    for await (const chunk of request) parts.push(Buffer.from(chunk));
    const headers = new Headers();
    for (const [name, value] of Object.entries(request.headers))
      if (typeof value === "string") headers.set(name, value);
    const answer = await handle(
      new Request(`${appUrl}${request.url}`, { method: "POST", headers, body: Buffer.concat(parts) }),
    );
    response.writeHead(answer.status, { "content-type": "application/json" });
    response.end(Buffer.from(await answer.arrayBuffer()));
  });
  return new Promise((resolve) => server.listen(port, "127.0.0.1", () => resolve(server)));
}

beforeAll(async () => {
  supervisor = await createSupervisor({ dataDir, quiet: true });
  const secrets = secretsIn(dataDir);
  urls = await startFakes({ supervisor, dataDir, secrets });
  const port = await freePort();
  appUrl = `http://127.0.0.1:${port}`;
  app = await startApp(port, storeEnvironment(urls, secrets));
});

afterAll(async () => {
  app.close();
  await supervisor.stopAll();
  rmSync(dataDir, { recursive: true, force: true });
});

const presigned = z.array(z.object({ url: z.string(), key: z.string() })).min(1);

function announce(slug: string, size: number, may = "yes") {
  const files = [{ name: "rail.csv", size, type: "text/csv", lastModified: 1 }];
  const headers = { "content-type": "application/json", "x-may": may };
  return fetch(`${appUrl}/api/uploadthing?actionType=upload&slug=${slug}`, {
    method: "POST",
    headers,
    body: JSON.stringify({ files, input: null }),
  });
}

async function put(slug: string, announced: number, content: string) {
  const [target] = presigned.parse(await (await announce(slug, announced)).json());
  if (!target) throw new Error("no address");
  const form = new FormData();
  form.append("file", new File([content], "rail.csv", { type: "text/csv" }));
  const answer = await fetch(target.url, { method: "PUT", body: form, headers: { range: "bytes=0-" } });
  return { key: target.key, status: answer.status, body: await answer.json() };
}

describe("an upload from the browser", () => {
  it("is told to the app, whose answer reaches the browser", async () => {
    const { status, body } = await put("evidence", 5, "0,4.9");
    expect(status).toBe(200);
    expect(body).toMatchObject({
      serverData: { unit: "A-001", name: "rail.csv" },
      fileHash: expect.stringMatching(/^[0-9a-f]{32}$/),
    });
  });

  it("is refused before it starts when the app says so", async () => {
    const refused = await announce("evidence", 5, "no");
    expect(refused.status).toBe(403);
  });

  it("ends in an error when the app cannot take the file in", async () => {
    const { body } = await put("broken", 5, "0,4.9");
    expect(body).toHaveProperty("error");
  });

  it("of another size than announced is reported to the app as failed", async () => {
    const { key, status } = await put("evidence", 5, "0,4");
    expect(status).toBe(400);
    await expect.poll(() => failed).toContain(key);
  });
});
