import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cleanFileName, contentDisposition, withExtension } from "@/lib/storage/file-name";
import { FILE_LIMITS } from "@/lib/storage/limits";

const cleaned = (name: string) => {
  const answer = cleanFileName(name);
  return answer.ok ? answer.value : answer.error.message;
};

describe("the name of a file", () => {
  it("stays as people write it", () => {
    expect(cleaned("Größe µA – U3.csv")).toBe("Größe µA – U3.csv");
    expect(cleaned("IMG_0001 (2).JPG")).toBe("IMG_0001 (2).JPG");
  });

  it.each(["../secret.png", "a/b.png", "C:\\scope\\b.png", "/etc/passwd"])("with a path is refused: %j", (name) => {
    expect(cleaned(name)).toMatch(/contains a path/);
  });

  it.each(["a\u0000.png", "a\nb.png", "a\u007f.png", "a\u0085.png", "\ud800.png"])(
    "with control characters is refused: %j",
    (name) => {
      expect(cleaned(name)).toMatch(/control characters/);
    },
  );

  it.each(["gpj.\u202exe", "\u2066a.png", "a\u200f.png"])("that turns the writing is refused: %j", (name) => {
    expect(cleaned(name)).toMatch(/direction of writing/);
  });

  it("is never empty, hidden or of dots only", () => {
    expect(cleaned("")).toBe("file");
    expect(cleaned(" ... ")).toBe("file");
    expect(cleaned(".htaccess")).toBe("htaccess");
    expect(cleaned("board.png. ")).toBe("board.png");
  });

  it("is cut before its extension when it is too long", () => {
    const most = FILE_LIMITS.fileNameCharacters;
    expect(cleaned(`${"a".repeat(most - 4)}.png`)).toBe(`${"a".repeat(most - 4)}.png`);
    for (const length of [most - 3, 5000]) {
      const name = cleaned(`${"a".repeat(length)}.png`);
      expect([...name]).toHaveLength(most);
      expect(name).toMatch(/a….png$/);
    }
  });

  it("whatever is given, comes out short, on one line and without a path, or not at all", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary", maxLength: 400 }), (given) => {
        const answer = cleanFileName(given);
        if (!answer.ok) return;
        expect([...answer.value].length).toBeLessThanOrEqual(FILE_LIMITS.fileNameCharacters);
        expect(answer.value).not.toMatch(/[/\\\u0000-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]/u);
        expect(answer.value).not.toBe("");
        expect(cleanFileName(answer.value)).toEqual(answer);
      }),
    );
  });

  it("gets the extension that its content has", () => {
    expect(withExtension("scope.jpeg", "png")).toBe("scope.png");
    expect(withExtension("scope", "png")).toBe("scope.png");
    expect(withExtension("scope.JPEG", "jpg", ["jpeg"])).toBe("scope.JPEG");
  });

  it("cannot break out of its header", () => {
    fc.assert(
      fc.property(fc.string({ unit: "grapheme", maxLength: 120 }), (name) => {
        expect(contentDisposition("attachment", name)).toMatch(
          /^attachment; filename="[\x20\x21\x23\x24\x26-\x5b\x5d-\x7e]*"; filename\*=UTF-8''[A-Za-z0-9%._~!-]*$/,
        );
      }),
    );
  });
});
