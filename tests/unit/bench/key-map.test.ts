import { describe, expect, it } from "vitest";
import { benchKey } from "@/components/bench/key-map";

type Target = { tagName?: string; type?: string; isContentEditable?: boolean } | null;
const body: Target = { tagName: "BODY" };
const press = (key: string, target: Target = body, more: object = {}) =>
  benchKey({ key, target, ctrlKey: false, metaKey: false, altKey: false, repeat: false, isComposing: false, ...more });

describe("keys at the bench", () => {
  it("do what the list of keys says", () => {
    expect([" ", "x", "X", "n", "p", "ArrowLeft", "ArrowRight", "Enter", "?"].map((key) => press(key))).toEqual([
      "conforms",
      "does-not-conform",
      "does-not-conform",
      "note",
      "photo",
      "previous",
      "next",
      "record",
      "keys",
    ]);
  });

  it("let a page-turning pedal walk the checks", () => {
    expect([press("PageUp"), press("PageDown")]).toEqual(["previous", "next"]);
  });

  it("are never taken from somebody who types in a field", () => {
    const fields: Target[] = [
      { tagName: "INPUT", type: "text" },
      { tagName: "INPUT" },
      { tagName: "TEXTAREA" },
      { tagName: "SELECT" },
      { tagName: "DIV", isContentEditable: true },
    ];
    for (const field of fields)
      for (const key of [" ", "x", "n", "p", "Enter", "ArrowLeft", "?"]) expect(press(key, field)).toBeUndefined();
  });

  it("leave space and Enter to a focused button, and the rest not", () => {
    const button: Target = { tagName: "BUTTON" };
    expect(press(" ", button)).toBeUndefined();
    expect(press("Enter", button)).toBeUndefined();
    expect(press("x", button)).toBe("does-not-conform");
  });

  it("leave the browser's own chords alone", () => {
    expect(press("p", body, { ctrlKey: true })).toBeUndefined();
    expect(press("x", body, { metaKey: true })).toBeUndefined();
    expect(press("ArrowLeft", body, { altKey: true })).toBeUndefined();
    expect(press("n", body, { isComposing: true })).toBeUndefined();
  });

  it("record once under a resting foot, while walking may repeat", () => {
    expect(press(" ", body, { repeat: true })).toBeUndefined();
    expect(press("Enter", body, { repeat: true })).toBeUndefined();
    expect(press("ArrowRight", body, { repeat: true })).toBe("next");
  });
});
