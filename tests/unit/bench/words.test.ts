import { describe, expect, it } from "vitest";
import { heldSentence } from "@/components/bench/HeldLine";
import { overtakenBy } from "@/components/bench/overtaken-by";
import { freshly } from "@/components/bench/queue/queue-store";
import { spoken } from "@/components/bench/read-aloud";
import { countsSentence, countsShort } from "@/components/traveler/counts-sentence";
import { attemptOf } from "./memory-store";

const attempt = (id: string, kind?: "waiting" | "refused" | "signed-out") => ({
  ...freshly(attemptOf(id, id)),
  order: 1,
  trouble: kind ? { kind, sentence: "…" } : null,
});
const queue = (held: ReturnType<typeof attempt>[], signedOut = false) => ({
  read: true,
  held,
  sending: null,
  signedOut,
});

describe("what the bench says is held", () => {
  it("is nothing while everything goes out at once", () => {
    expect(heldSentence(queue([]))).toBeUndefined();
    expect(heldSentence(queue([attempt("a")]))).toBeUndefined();
  });

  it("counts what waits for the network", () => {
    const said = heldSentence(queue([attempt("a", "waiting"), attempt("b"), attempt("c")]));
    expect(said).toMatchObject({ text: "Held on this device (3).", wrong: false });
  });

  it("puts a refusal and a lost sign-in before everything else", () => {
    expect(heldSentence(queue([attempt("a", "refused"), attempt("b", "waiting")]))).toMatchObject({
      wrong: true,
      follows: "One was not recorded: look at it.",
    });
    expect(heldSentence(queue([attempt("a", "signed-out")], true))?.follows).toBe(
      "You are signed out. Sign in and they go out.",
    );
  });
});

describe("reading aloud", () => {
  it("says limits and units in words", () => {
    expect(spoken("4.75 … 5.25 V")).toBe("4.75 to 5.25 volt");
    expect(spoken("< 0.5 Ω, 10 kΩ")).toBe("below 0.5 ohm, 10 kilohm");
    expect(spoken("5\u202fV ± 5 %")).toBe("5 volt plus or minus 5 %");
  });
});

describe("how a traveler stands, in a sentence", () => {
  it("names what needs attention", () => {
    expect(countsSentence(["passed", "conceded", "doubtful", "doubtful", "failed", "untested"])).toBe(
      "2 of 6 checks hold. 1 fails, 2 are in doubt, 1 is conceded.",
    );
    expect(countsSentence(["passed", "passed"])).toBe("All 2 checks hold.");
    expect(countsShort(["passed", "doubtful", "failed"])).toBe("1 of 3 hold, 1 fails, 1 in doubt");
  });
});

describe("two people at one check", () => {
  it("are told of each other", () => {
    expect(overtakenBy({ overtook: { by: "Ines", at: "2026-02-03T19:40:00Z", summary: "4.9 V" } })).toContain(
      "Ines recorded this check just before you: 4.9 V.",
    );
    expect(overtakenBy({ overtook: null })).toBeUndefined();
    expect(overtakenBy("<html>")).toBeUndefined();
  });
});
