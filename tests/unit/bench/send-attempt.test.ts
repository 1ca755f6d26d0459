import { describe, expect, it } from "vitest";
import { backOff } from "@/components/bench/queue/back-off";
import { outcomeOf } from "@/components/bench/queue/send-attempt";

describe("an answer of the server", () => {
  it("is final when the server understood and said no, with its own sentence", () => {
    const body = { detail: "The check was retired.", errors: { record: "It is not there." } };
    for (const status of [400, 403, 404, 409, 410, 413, 422]) {
      expect(outcomeOf(status, body, null)).toEqual({
        kind: "refused",
        sentence: "The check was retired.",
        fields: { record: "It is not there." },
      });
    }
  });

  it("means again later when the database is away, the server stumbles or asks for patience", () => {
    for (const status of [408, 425, 429, 500, 502, 503, 504]) {
      expect(outcomeOf(status, { detail: "The database does not answer just now." }, null)).toMatchObject({
        kind: "later",
      });
    }
    expect(outcomeOf(429, undefined, "7")).toMatchObject({ kind: "later", afterMs: 7000 });
  });

  it("is kept with a sentence when it is no problem document at all", () => {
    expect(outcomeOf(418, "<html>", null)).toEqual({ kind: "refused", sentence: "The server refused it (418)." });
  });

  it("signed out is a state of its own", () => {
    expect(outcomeOf(401, undefined, null).kind).toBe("signed-out");
  });
});

describe("the wait before the next try", () => {
  it("doubles from one second up to a minute", () => {
    expect([1, 2, 3, 4, 5, 6, 7, 50].map((tries) => backOff(tries, 0))).toEqual([
      1000, 2000, 4000, 8000, 16000, 32000, 60000, 60000,
    ]);
  });

  it("is spread so that several devices do not come back at the same instant", () => {
    expect(backOff(3, 1)).toBe(3000);
    expect(backOff(3, 0.5)).toBe(3500);
  });
});
