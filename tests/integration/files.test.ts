import { createHash } from "node:crypto";
import { eq } from "drizzle-orm";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { GET } from "@/app/api/projects/[project]/files/[file]/route";
import { database } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import type { Viewer } from "@/lib/access/scope";
import { captionAttachment } from "@/lib/attachment/caption-attachment";
import { loadCaptures } from "@/lib/attachment/load-captures";
import { makeThumbnails } from "@/lib/attachment/make-thumbnails";
import { removeAttachment } from "@/lib/attachment/remove-attachment";
import { restoreAttachment } from "@/lib/attachment/restore-attachment";
import { deleteObjects } from "@/lib/storage/object-store";
import { must, refusal, send as record, conforms } from "@/tests/support/bench";
import { useDatabase } from "@/tests/support/database";
import { plainPng, scopeText } from "@/tests/support/hostile-files";
import { makeEvidence } from "@/tests/support/project";
import { send, startUploadApp } from "@/tests/support/upload-app";
import { openWorkshop, type Workshop } from "@/tests/support/workshop";

const asking = vi.hoisted((): { viewer: Viewer | undefined } => ({ viewer: undefined }));
vi.mock("@/lib/auth/current-viewer", () => ({ currentViewer: async () => asking.viewer }));

useDatabase();
let workshop: Workshop;
let app: Awaited<ReturnType<typeof startUploadApp>>;
let picture: string;
let data: string;
const csv = scopeText(400);

async function attach(name: string, bytes: Uint8Array): Promise<string> {
  const answer = await send(app, { project: workshop.slug, name, bytes, checkId: workshop.check.id });
  if (!answer.ok) throw new Error(answer.message);
  return answer.attachment.id;
}

beforeAll(async () => {
  app = await startUploadApp();
  workshop = await openWorkshop();
  asking.viewer = workshop.builder;
  picture = await attach("Größe „CLK“.png", await plainPng(640, 480));
  data = await attach("CLK.csv", csv);
});
beforeEach(() => {
  asking.viewer = workshop.collaborator;
});
afterAll(() => app.close());

type Asked = { query?: string; headers?: Record<string, string>; project?: string };

function read(file: string, { query = "", headers = {}, project = workshop.slug }: Asked = {}) {
  const request = new Request(`http://localhost/api/projects/${project}/files/${file}${query}`, { headers });
  return GET(request, { params: Promise.resolve({ project, file }) });
}

describe("a file of the project", () => {
  it("is shown to everybody in it, as what it is and never as anything else", async () => {
    const response = await read(picture);
    expect(response.status).toBe(200);
    expect(response.headers.get("content-type")).toBe("image/png");
    expect(response.headers.get("x-content-type-options")).toBe("nosniff");
    expect(response.headers.get("content-security-policy")).toContain("sandbox");
    expect(response.headers.get("cache-control")).toMatch(/^private/);
    expect(response.headers.get("content-disposition")).toBe(
      `inline; filename="Gr__e _CLK_.png"; filename*=UTF-8''Gr%C3%B6%C3%9Fe%20%E2%80%9ECLK%E2%80%9C.png`,
    );
    const bytes = Buffer.from(await response.arrayBuffer());
    expect(response.headers.get("etag")).toBe(`"${createHash("sha256").update(bytes).digest("hex")}"`);
  });

  it("is a download when it is data, byte for byte", async () => {
    const response = await read(data);
    expect(response.headers.get("content-disposition")).toMatch(/^attachment; /);
    expect(response.headers.get("content-type")).toMatch(/^text\/csv/);
    expect(Buffer.from(await response.arrayBuffer()).equals(csv)).toBe(true);
  });

  it("is not sent again to a browser that has it", async () => {
    const etag = (await read(picture)).headers.get("etag") ?? "";
    expect((await read(picture, { headers: { "if-none-match": etag } })).status).toBe(304);
    expect((await read(picture, { headers: { "if-none-match": '"other"' } })).status).toBe(200);
  });

  it("comes in parts when a part is asked for", async () => {
    const response = await read(data, { headers: { range: "bytes=6-16" } });
    expect(response.status).toBe(206);
    expect(response.headers.get("content-range")).toBe(`bytes 6-16/${csv.length}`);
    expect(await response.text()).toBe("Bench scope");
    expect((await read(data, { headers: { range: `bytes=${csv.length + 5}-` } })).status).toBe(416);
    expect((await read(data, { headers: { range: "bytes=6-16", "if-range": '"other"' } })).status).toBe(200);
  });

  it("is shown whole while the worker has not made its thumbnail", async () => {
    asking.viewer = workshop.builder;
    const fresh = await attach("fresh.png", await plainPng(900, 700));
    await database().update(attachments).set({ smallKey: null, largeKey: null }).where(eq(attachments.id, fresh));
    const whole = await read(fresh, { query: "?size=small" });
    expect(whole.headers.get("content-type")).toBe("image/png");
    expect(whole.headers.get("cache-control")).toBe("private, no-cache");
    await makeThumbnails({ attachmentId: fresh });
    const small = await read(fresh, { query: "?size=small" });
    expect(small.headers.get("content-type")).toBe("image/webp");
    expect(small.headers.get("etag")).not.toBe(whole.headers.get("etag"));
  });

  it("is gone, said so, when the object store lost it", async () => {
    const lost = await makeEvidence({ id: workshop.projectId });
    await deleteObjects([`test/${lost}`]);
    expect((await read(lost)).status).toBe(410);
  });
});

describe("who may not see a file", () => {
  it("is told nothing: signed out 401, a member of another project 404, by either address", async () => {
    asking.viewer = undefined;
    expect((await read(picture)).status).toBe(401);
    const other = await openWorkshop();
    asking.viewer = other.maintainer;
    expect((await read(picture)).status).toBe(404);
    expect((await read(picture, { project: other.slug })).status).toBe(404);
  });

  it("gets a sentence for an address that is none", async () => {
    expect((await read("not-an-id")).status).toBe(400);
    expect((await read(picture, { query: "?size=huge" })).status).toBe(400);
    expect((await read(crypto.randomUUID())).status).toBe(404);
  });
});

describe("changing what is attached", () => {
  const named = (attachmentId: string) => ({ project: workshop.slug, writeId: crypto.randomUUID(), attachmentId });

  it("a removed file is out of sight until it is restored", async () => {
    const scope = workshop.scopes.builder;
    const query = { kind: "scope-data", unit: undefined, page: 1 } as const;
    await must(removeAttachment(scope, named(data)));
    expect((await read(data)).status).toBe(404);
    expect((await loadCaptures(scope, query)).captures).toEqual([]);
    await must(restoreAttachment(scope, named(data)));
    expect((await read(data)).status).toBe(200);
    expect((await loadCaptures(scope, query)).captures).toMatchObject([
      { id: data, unit: { serial: "CON-01" }, check: { title: "Rise time of CLK" } },
    ]);
  });

  it("evidence of an attempt stays with the attempt", async () => {
    const scope = workshop.scopes.builder;
    const taken = await attachAs(workshop.builder, "attempt.png");
    await must(record(scope, workshop.check.id, { record: conforms, attachmentIds: [taken] }));
    const refused = await refusal(removeAttachment(scope, named(taken)));
    expect(refused).toMatchObject({ code: "conflict", message: expect.stringContaining("Void the attempt first") });
    expect((await read(taken)).status).toBe(200);
  });

  it("a caption is kept, and another project's file is not found", async () => {
    await must(captionAttachment(workshop.scopes.builder, { ...named(picture), caption: "CLK at U3" }));
    const other = await openWorkshop();
    const foreign = captionAttachment(other.scopes.builder, { ...named(picture), caption: "mine" });
    expect((await refusal(foreign)).code).toBe("not-found");
    const [row] = await database().select().from(attachments).where(eq(attachments.id, picture));
    expect(row?.caption).toBe("CLK at U3");
  });

  async function attachAs(viewer: Viewer, name: string) {
    asking.viewer = viewer;
    return attach(name, await plainPng());
  }
});

describe("the captures", () => {
  it("are listed by kind and unit, counted, and never those of another project", async () => {
    const scope = workshop.scopes.collaborator;
    const view = await loadCaptures(scope, { kind: "photo", unit: "CON-01", page: 99 });
    expect(view.page).toBe(1);
    expect(view.units).toEqual(["CON-01"]);
    expect(view.counts.photo).toBe(view.captures.length);
    expect(view.captures.map((capture) => capture.id)).toContain(picture);
    const other = await openWorkshop();
    expect((await loadCaptures(other.scopes.builder, { kind: "photo", unit: undefined, page: 1 })).total).toBe(0);
  });
});
