import { randomUUID } from "node:crypto";
import { createHash } from "node:crypto";
import { eq } from "drizzle-orm";
import sharp from "sharp";
import { UTApi } from "uploadthing/server";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { closeDatabase, database } from "@/db/client";
import { events } from "@/db/schema/events";
import { attachments } from "@/db/schema/evidence";
import type { Viewer } from "@/lib/access/scope";
import { makeThumbnails } from "@/lib/attachment/make-thumbnails";
import { sweepObjects } from "@/lib/attachment/sweep-objects";
import { FILE_LIMITS } from "@/lib/storage/limits";
import { listObjects, putObject, readWhole } from "@/lib/storage/object-store";
import { bombPng, html, pdf, photoWithPlace, plainPng, scopeText, svg } from "@/tests/support/hostile-files";
import { announce, linkFor, putTo, send, startUploadApp } from "@/tests/support/upload-app";
import { openWorkshop, type Workshop } from "@/tests/support/workshop";

const asking = vi.hoisted((): { viewer: Viewer | undefined } => ({ viewer: undefined }));
vi.mock("@/lib/auth/current-viewer", () => ({ currentViewer: async () => asking.viewer }));

let workshop: Workshop;
let app: Awaited<ReturnType<typeof startUploadApp>>;

beforeAll(async () => {
  app = await startUploadApp();
  workshop = await openWorkshop();
});
beforeEach(() => {
  asking.viewer = workshop.builder;
});
afterAll(async () => {
  app.close();
  await closeDatabase();
});

const rows = () =>
  database()
    .select()
    .from(attachments)
    .where(eq(attachments.projectId, workshop.projectId))
    .orderBy(attachments.createdAt);
const keys = async () => (await listObjects(0, 500)).objects.map((object) => object.key).sort();

/** Objects whose name contains the text: others may use the store at the same time. */
async function objectsNamed(text: string) {
  const { files } = await new UTApi({ logLevel: "None" }).listFiles({ limit: 500 });
  return files.filter((file) => file.name.includes(text));
}
const plainRows = async () => (await rows()).map(({ smallKey: _small, largeKey: _large, ...row }) => row);

/** Sends and expects a refusal with this sentence, and neither a row nor an object more than before. */
async function expectNothingKept(name: string, bytes: Uint8Array, sentence: RegExp) {
  const mark = randomUUID();
  const before = await plainRows();
  const answer = await send(app, { project: workshop.slug, name: `${mark} ${name}`, bytes });
  expect(answer).toMatchObject({ ok: false, message: expect.stringMatching(sentence), retry: false });
  expect(await objectsNamed(mark)).toEqual([]);
  expect(await plainRows()).toEqual(before);
}

describe("a photo that arrives whole", () => {
  it("stands upright, without the place it was taken at, beside its check", async () => {
    const bytes = await photoWithPlace(120, 80);
    const before = await sharp(bytes).metadata();
    expect(before.orientation).toBe(6);
    expect(before.exif?.includes("Bench Camera")).toBe(true);

    const answer = await send(app, { project: workshop.slug, name: "IMG 0001.JPG", bytes, checkId: workshop.check.id });
    if (!answer.ok) throw new Error(answer.message);
    expect(answer.attachment).toMatchObject({
      kind: "photo",
      fileName: "IMG 0001.JPG",
      width: 80,
      height: 120,
      hasThumbnails: false,
    });
    const [row] = await database().select().from(attachments).where(eq(attachments.id, answer.attachment.id));
    expect(row).toMatchObject({
      checkId: workshop.check.id,
      unitId: workshop.unit.id,
      uploadedBy: workshop.builder.userId,
      mediaType: "image/jpeg",
    });

    const kept = await readWhole(row?.objectKey ?? "", 1_000_000);
    if (!kept) throw new Error("nothing kept");
    const after = await sharp(kept).metadata();
    expect(after).toMatchObject({ width: 80, height: 120 });
    expect(after.exif).toBeUndefined();
    expect(after.orientation).toBeUndefined();
    expect(kept.includes("Bench Camera")).toBe(false);
    expect(createHash("sha256").update(kept).digest("hex")).toBe(row?.sha256);
    expect(kept.length).toBe(row?.bytes);
  });

  it("leaves one event and no raw file behind", async () => {
    const bytes = await photoWithPlace(60, 40);
    const link = await linkFor(app, { project: workshop.slug, name: "board.jpg", bytes });
    const answer = await putTo(link, "board.jpg", bytes);
    if (!answer.ok) throw new Error(answer.message);
    const happened = await database().select().from(events).where(eq(events.subjectId, answer.attachment.id));
    expect(happened).toMatchObject([{ kind: "evidence.attached", payload: { kind: "photo", fileName: "board.jpg" } }]);
    expect(await keys()).not.toContain(link.key);
    expect(await objectsNamed("board.jpg")).not.toEqual([]);
  });

  it("is one row however often the same upload is sent", async () => {
    const bytes = await plainPng();
    const uploadId = randomUUID();
    const sending = { project: workshop.slug, name: "twice.png", bytes, uploadId };
    const [one, two] = await Promise.all([send(app, sending), send(app, sending)]);
    const three = await send(app, sending);
    if (!one.ok || !two.ok || !three.ok) throw new Error("refused");
    expect(two.attachment.id).toBe(one.attachment.id);
    expect(three.attachment.id).toBe(one.attachment.id);
    const kept = (await rows()).filter((row) => row.uploadId === uploadId);
    expect(kept).toHaveLength(1);
    expect(await keys()).toContain(kept[0]?.objectKey);
  });

  it("becomes the kind of picture that is wanted", async () => {
    const answer = await send(app, {
      project: workshop.slug,
      name: "shot.png",
      bytes: await plainPng(),
      kinds: ["scope-data", "scope-picture"],
    });
    expect(answer).toMatchObject({ ok: true, attachment: { kind: "scope-picture" } });
  });

  it("gets two thumbnails once, however often the worker is told", async () => {
    const answer = await send(app, { project: workshop.slug, name: "large.png", bytes: await plainPng(1600, 1200) });
    if (!answer.ok) throw new Error(answer.message);
    const { id } = answer.attachment;
    await Promise.all([makeThumbnails({ attachmentId: id }), makeThumbnails({ attachmentId: id })]);
    await makeThumbnails({ attachmentId: id });
    const [row] = await database().select().from(attachments).where(eq(attachments.id, id));
    const sides = await Promise.all(
      [row?.smallKey, row?.largeKey].map(async (key) => sharp(await readWhole(key ?? "", 1_000_000)).metadata()),
    );
    expect(sides).toMatchObject([
      { format: "webp", width: FILE_LIMITS.thumbnails.small, height: 240 },
      { format: "webp", width: FILE_LIMITS.thumbnails.large, height: 960 },
    ]);
  });
});

describe("scope data", () => {
  it("keeps its very bytes and their hash", async () => {
    const bytes = scopeText(500);
    const answer = await send(app, { project: workshop.slug, name: "CLK.csv", bytes });
    if (!answer.ok) throw new Error(answer.message);
    expect(answer.attachment).toMatchObject({ kind: "scope-data", bytes: bytes.length, width: null });
    const [row] = await database().select().from(attachments).where(eq(attachments.id, answer.attachment.id));
    expect(await readWhole(row?.objectKey ?? "", 1_000_000)).toEqual(bytes);
    expect(row).toMatchObject({ mediaType: "text/csv", sha256: createHash("sha256").update(bytes).digest("hex") });
  });
});

describe("a file that cannot be evidence", () => {
  it("HTML named like a picture", () => expectNothingKept("board.jpg", html, /web page \(HTML\)/));
  it("SVG, which can carry programs", () => expectNothingKept("drawing.svg", svg, /SVG/));
  it("a PDF", () => expectNothingKept("sheet.pdf", pdf, /PDF document/));
  it("text that is no table", () =>
    expectNothingKept("notes.txt", Buffer.from("the clock rings\nat U3\n"), /not a table/));
  it("a table named like a picture", () =>
    expectNothingKept("scope.png", scopeText(50), /named like a picture but contains text/));
  it("a picture named like a table", async () =>
    expectNothingKept("scope.csv", await plainPng(), /contains a picture/));
  it("a picture that was cut off", async () => {
    const whole = await sharp({
      create: {
        width: 800,
        height: 600,
        channels: 3,
        noise: { type: "gaussian", mean: 128, sigma: 40 },
        background: "#000",
      },
    })
      .jpeg()
      .toBuffer();
    await expectNothingKept("cut.jpg", whole.subarray(0, whole.length / 2), /damaged or was cut off/);
  });
  it("a picture that would unfold to gigabytes", () =>
    expectNothingKept("bomb.png", bombPng(60_000, 60_000), /60000 × 60000 pixels; the most is 64 megapixels/));
  it("a picture of one line that is far too long", () =>
    expectNothingKept("line.png", bombPng(FILE_LIMITS.side + 1, 1), /16001 × 1 pixels/));
  it("random bytes", () =>
    expectNothingKept(
      "board.jpg",
      Buffer.from(Array.from({ length: 4000 }, (_, n) => (n * 7919) % 256)),
      /is none|neither/,
    ));

  it("a picture where data is wanted", async () => {
    const answer = await send(app, {
      project: workshop.slug,
      name: "a.png",
      bytes: await plainPng(),
      kinds: ["scope-data"],
    });
    expect(answer).toMatchObject({ ok: false, message: expect.stringContaining("scope data as text is wanted here") });
  });
});

describe("before a byte is sent", () => {
  const refusal = async (sending: Partial<Parameters<typeof announce>[1]>) => {
    const response = await announce(app, {
      project: workshop.slug,
      name: "a.png",
      bytes: Buffer.from("x"),
      ...sending,
    });
    const body: { detail?: string } = await response.json();
    return { status: response.status, detail: body.detail };
  };
  const sentence = (text: string) => expect.stringContaining(text);

  it("an empty file is refused", async () => {
    expect(await refusal({ announced: 0 })).toEqual({ status: 400, detail: sentence("empty (0 bytes)") });
  });
  it("a file at the limit is taken, one byte above and far above are refused", async () => {
    const most = FILE_LIMITS.bytes.photo;
    const kinds: ["photo"] = ["photo"];
    expect(
      (await announce(app, { project: workshop.slug, name: "a.png", bytes: Buffer.alloc(0), announced: most, kinds }))
        .status,
    ).toBe(200);
    for (const announced of [most + 1, 1000 * most]) {
      expect(await refusal({ announced, kinds })).toEqual({
        status: 413,
        detail: sentence("the most that can be kept here is 25 MB"),
      });
    }
  });
  it("a size that is no size is refused", async () => {
    expect((await refusal({ announced: -5 })).status).toBe(400);
    expect((await refusal({ announced: 1.5 })).status).toBe(400);
  });
  it("names with a path, control characters or turned writing are refused", async () => {
    expect(await refusal({ name: "../../etc/passwd.png" })).toEqual({
      status: 400,
      detail: sentence("contains a path"),
    });
    expect(await refusal({ name: "C:\\board.png" })).toEqual({ status: 400, detail: sentence("contains a path") });
    expect(await refusal({ name: "bo\u0000ard.png" })).toEqual({ status: 400, detail: sentence("control characters") });
    expect(await refusal({ name: "gnp\u202eexe.png" })).toEqual({
      status: 400,
      detail: sentence("direction of writing"),
    });
  });
  it("a check of another project is not found", async () => {
    const other = await openWorkshop();
    expect((await refusal({ checkId: other.check.id })).status).toBe(404);
    expect((await refusal({ checkId: randomUUID() })).status).toBe(404);
  });
  it("people who may not attach are refused, strangers are told of no project", async () => {
    asking.viewer = workshop.collaborator;
    expect((await refusal({})).status).toBe(403);
    asking.viewer = (await openWorkshop()).maintainer;
    expect((await refusal({})).status).toBe(404);
    asking.viewer = undefined;
    expect((await refusal({})).status).toBe(401);
  });
  it("a body that is no request, or far too large, is refused", async () => {
    const post = (body: string) =>
      fetch(`${app.url}?actionType=upload&slug=evidence`, {
        method: "POST",
        body,
        headers: { "content-type": "application/json" },
      });
    expect((await post("not json")).status).toBe(400);
    expect((await post(JSON.stringify({ files: [], input: { project: workshop.slug } }))).status).toBe(400);
    expect((await post("x".repeat(10_000_000))).status).toBe(413);
  });
});

describe("an upload that goes wrong on its way", () => {
  it("leaves no row when it never finishes", async () => {
    const before = await plainRows();
    await linkFor(app, { project: workshop.slug, name: "never.png", bytes: await plainPng() });
    expect(await plainRows()).toEqual(before);
  });

  it("keeps nothing when the person was removed meanwhile", async () => {
    const other = await openWorkshop();
    asking.viewer = other.builder;
    const bytes = await plainPng();
    const link = await linkFor(app, { project: other.slug, name: "late.png", bytes });
    const { memberships } = await import("@/db/schema/projects");
    await database().delete(memberships).where(eq(memberships.userId, other.builder.userId));
    expect(await putTo(link, "late.png", bytes)).toMatchObject({ ok: false });
    expect(await keys()).not.toContain(link.key);
  });

  it("is not believed when the message is not from the object store", async () => {
    const before = await plainRows();
    const forged = await fetch(`${app.url}?slug=evidence`, {
      method: "POST",
      headers: {
        "uploadthing-hook": "callback",
        "x-uploadthing-signature": "hmac-sha256=00",
        "content-type": "application/json",
      },
      body: JSON.stringify({ status: "uploaded", origin: "http://localhost", metadata: {}, file: {} }),
    });
    expect(forged.status).toBe(400);
    expect(await plainRows()).toEqual(before);
  });
});

describe("the sweep", () => {
  it("takes objects without a row once they are an hour old, and nothing else", async () => {
    const kept = await send(app, { project: workshop.slug, name: "stays.png", bytes: await plainPng() });
    if (!kept.ok) throw new Error(kept.message);
    await makeThumbnails({ attachmentId: kept.attachment.id });
    const [row] = await database().select().from(attachments).where(eq(attachments.id, kept.attachment.id));
    const orphan = await putObject(Buffer.from("left behind"), "orphan.txt", "text/plain");

    await sweepObjects(new Date());
    expect(await keys()).toContain(orphan);

    const before = await plainRows();
    const { deleted } = await sweepObjects(new Date(Date.now() + 3_700_000));
    expect(deleted).toBeGreaterThanOrEqual(1);
    const left = await keys();
    expect(left).not.toContain(orphan);
    for (const key of [row?.objectKey, row?.smallKey, row?.largeKey]) expect(left).toContain(key);
    expect(await plainRows()).toEqual(before);
  });
});
