import { describe, expect, it } from "vitest";
import type { HeldAttempt, HeldFile } from "@/components/bench/queue/held-attempt";
import { freshly } from "@/components/bench/queue/queue-store";
import { sendWithFiles, type Uploaded } from "@/components/bench/queue/send-with-files";
import { attemptOf } from "./memory-store";

const photo = (uploadId: string): HeldFile => ({
  uploadId,
  checkId: "one",
  userId: "mo",
  fileName: `${uploadId}.jpg`,
  kind: "photo",
  kinds: ["photo"],
  file: new Blob(["x"]),
  attachmentId: null,
  refusal: "",
});

const held = (...files: HeldFile[]): HeldAttempt => ({ ...freshly(attemptOf("a", "one")), order: 1, files });

function shed(answers: Record<string, Uploaded>) {
  const sent: HeldAttempt[] = [];
  const kept: HeldAttempt[] = [];
  const uploads: string[] = [];
  return {
    sent,
    kept,
    uploads,
    run: (attempt: HeldAttempt) =>
      sendWithFiles({
        attempt,
        upload: async (_, file) => {
          uploads.push(file.uploadId);
          return answers[file.uploadId] ?? { ok: false, message: "There is no network just now.", retry: true };
        },
        keep: async (next) => void kept.push(next),
        send: async (next) => {
          sent.push(next);
          return { kind: "accepted", answer: null };
        },
      }),
  };
}

describe("photos that were taken without network", () => {
  it("go up before the attempt, which then names them", async () => {
    const device = shed({ p1: { ok: true, attachmentId: "x1" }, p2: { ok: true, attachmentId: "x2" } });
    expect(await device.run(held(photo("p1"), photo("p2")))).toMatchObject({ kind: "accepted" });
    expect(device.uploads).toEqual(["p1", "p2"]);
    expect(device.sent[0]?.body.attachmentIds).toEqual(["x1", "x2"]);
  });

  it("are not sent again when one of them got through before the network went", async () => {
    const device = shed({ p1: { ok: true, attachmentId: "x1" } });
    expect(await device.run(held(photo("p1"), photo("p2")))).toMatchObject({ kind: "later" });
    expect(device.sent).toEqual([]);
    const written = device.kept.at(-1);
    if (!written) throw new Error("nothing was written down");
    expect(written.files[0]).toMatchObject({ attachmentId: "x1", file: null });
    const later = shed({ p2: { ok: true, attachmentId: "x2" } });
    await later.run(written);
    expect(later.uploads).toEqual(["p2"]);
    expect(later.sent[0]?.body.attachmentIds).toEqual(["x1", "x2"]);
  });

  it("hold the attempt back with the server's sentence when the server will not have one of them", async () => {
    const device = shed({ p1: { ok: false, message: "This is not a picture.", retry: false } });
    expect(await device.run(held(photo("p1")))).toEqual({ kind: "refused", sentence: "This is not a picture." });
    expect(device.sent).toEqual([]);
  });
});
