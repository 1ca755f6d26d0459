import { mkdtempSync, readdirSync, rmSync } from "node:fs";
import { connect } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { UTApi, UTFile } from "uploadthing/server";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { sign } from "@/scripts/fakes/object-store/signature";
import { secretsIn, type Secrets } from "@/scripts/fakes/secrets";
import { startFakes, storeEnvironment, type FakeUrls } from "@/scripts/fakes/start-fakes";
import { createSupervisor, type Supervisor } from "@/scripts/processes/supervisor";

const dataDir = mkdtempSync(join(tmpdir(), "boardwake-fakes-"));
let supervisor: Supervisor;
let urls: FakeUrls;
let secrets: Secrets;
let store: UTApi;

beforeAll(async () => {
  supervisor = await createSupervisor({ dataDir, quiet: true });
  secrets = secretsIn(dataDir);
  urls = await startFakes({ supervisor, dataDir, secrets });
  store = new UTApi({
    token: storeEnvironment(urls, secrets)["UPLOADTHING_TOKEN"],
    ingestUrl: urls.objectStore,
    apiUrl: urls.objectStore,
    ufsHost: new URL(urls.objectStore).host,
    ufsAppIdLocation: "path",
    logLevel: "None",
  });
});

afterAll(async () => {
  await supervisor.stopAll();
  rmSync(dataDir, { recursive: true, force: true });
});

const order = (fake: string, query: string) => fetch(`${fake}/__fake/fail?${query}`, { method: "POST" });

describe("the object store", () => {
  const trace = new UTFile(["0,0.01\n1,4.98\n"], "clock – rising edge.csv", { type: "text/csv" });

  async function upload(acl: "private" | "public-read" = "private") {
    const { data, error } = await store.uploadFiles(trace, { acl });
    if (!data) throw new Error(error?.message);
    return data;
  }

  it("gives a private file back, whole or in part, to whoever holds a signed link", async () => {
    const { key, size } = await upload();
    const { ufsUrl } = await store.generateSignedURL(key, { expiresIn: 60 });
    const whole = await fetch(ufsUrl);
    expect(whole.headers.get("content-type")).toBe("text/csv");
    expect(whole.headers.get("cache-control")).toBe("private, no-store");
    expect(await whole.text()).toBe("0,0.01\n1,4.98\n");

    const part = await fetch(ufsUrl, { headers: { range: "bytes=2-5" } });
    expect(part.status).toBe(206);
    expect(part.headers.get("content-range")).toBe(`bytes 2-5/${size}`);
    expect(await part.text()).toBe("0.01");
    const last = await fetch(ufsUrl, { headers: { range: "bytes=-5" } });
    expect(await last.text()).toBe("4.98\n");
    const outside = await fetch(ufsUrl, { headers: { range: "bytes=900-" } });
    expect(outside.status).toBe(416);
  });

  it("refuses a private file without a signature, with a changed one and after the link has expired", async () => {
    const { key, ufsUrl: unsigned } = await upload();
    expect((await fetch(unsigned)).status).toBe(403);
    const { ufsUrl } = await store.generateSignedURL(key, { expiresIn: 60 });
    expect((await fetch(ufsUrl.replace("expires=1", "expires=2"))).status).toBe(403);
    const { ufsUrl: old } = await store.generateSignedURL(key, { expiresIn: -1 });
    expect((await fetch(old)).status).toBe(403);
  });

  it("lists what it holds, and after deleting answers 404", async () => {
    const { key } = await upload("public-read");
    const listed = await store.listFiles();
    expect(listed.files.map((file) => file.key)).toContain(key);
    const { ufsUrl } = await store.generateSignedURL(key);
    expect((await fetch(ufsUrl)).status).toBe(200);
    expect(await store.deleteFiles(key)).toMatchObject({ success: true, deletedCount: 1 });
    expect((await fetch(ufsUrl)).status).toBe(404);
  });

  it("answers a wrong secret key with an error", async () => {
    const token = Buffer.from(
      JSON.stringify({ apiKey: "sk_wrong", appId: secrets.appId, regions: ["local"] }),
    ).toString("base64");
    const stranger = new UTApi({ token, apiUrl: urls.objectStore, logLevel: "None" });
    await expect(stranger.listFiles()).rejects.toThrow();
  });

  it("keeps an upload's size to what was announced", async () => {
    const address = announcedAddress("short.csv", 4);
    const form = new FormData();
    form.append("file", new Blob(["far more than four bytes"]));
    expect((await fetch(address, { method: "PUT", body: form })).status).toBe(413);
    const small = new FormData();
    small.append("file", new Blob(["abc"]));
    expect((await fetch(address, { method: "PUT", body: small })).status).toBe(400);
    expect(await names()).not.toContain("short.csv");
  });

  it("stores nothing of an upload that was cut off, and resumes it where it stopped", async () => {
    const address = announcedAddress("long.csv", 60_000);
    const { port, host, pathname, search } = new URL(address);
    const head = '--cut\r\ncontent-disposition: form-data; name="file"; filename="a"\r\n\r\n';
    await new Promise<void>((resolve) => {
      const socket = connect(Number(port), "127.0.0.1", () => {
        socket.write(
          `PUT ${pathname}${search} HTTP/1.1\r\nhost: ${host}\r\ncontent-type: multipart/form-data; boundary=cut\r\n`,
        );
        socket.write(`content-length: 60100\r\n\r\n${head}${"a".repeat(20_000)}`, () =>
          setImmediate(() => socket.destroy()),
        );
      });
      socket.once("close", () => resolve());
    });
    const resume = await fetch(address, { method: "HEAD" });
    const start = Number(resume.headers.get("x-ut-range-start"));
    expect(start).toBeLessThan(60_000);
    expect(await names()).not.toContain("long.csv");

    const rest = new FormData();
    rest.append("file", new Blob(["b".repeat(60_000 - start)]));
    const done = await fetch(address, { method: "PUT", body: rest, headers: { range: `bytes=${start}-` } });
    expect(done.status).toBe(200);
    expect(await names()).toContain("long.csv");
    expect(readdirSync(join(dataDir, "object-store", "incoming"))).toEqual([]);
  });

  it("fails as often as a test orders, then works again", async () => {
    await order(urls.objectStore, "mode=500&count=1&on=upload");
    const failed = await store.uploadFiles(trace);
    expect(failed.error?.code).toBe("UPLOAD_FAILED");
    expect((await store.uploadFiles(trace)).error).toBeNull();
  });

  it("lets a browser of another origin upload", async () => {
    const answer = await fetch(`${urls.objectStore}/some-key`, { method: "OPTIONS" });
    expect(answer.headers.get("access-control-allow-origin")).toBe("*");
    expect(answer.headers.get("access-control-allow-headers")).toContain("x-uploadthing-version");
  });

  /** An upload address as the app hands it to a browser. */
  function announcedAddress(name: string, size: number): string {
    const url = new URL(`${urls.objectStore}/key-of-${name}`);
    const claim = {
      "x-ut-identifier": secrets.appId,
      "x-ut-file-name": name,
      "x-ut-file-size": String(size),
      "x-ut-file-type": "text/csv",
    };
    url.searchParams.append("expires", String(Date.now() + 60_000));
    for (const [field, value] of Object.entries(claim)) url.searchParams.append(field, encodeURIComponent(value));
    url.searchParams.append("signature", sign(url.toString(), secrets.storeKey));
    return url.href;
  }

  const names = async () => (await store.listFiles()).files.map((file) => file.name);
});
