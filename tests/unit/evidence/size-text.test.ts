import { describe, expect, it } from "vitest";
import { checkSize } from "@/lib/attachment/check-size";
import { FILE_LIMITS, limitsText, sizeText } from "@/lib/storage/limits";

describe("sizes", () => {
  it.each([
    [0, "0 bytes"],
    [1, "1 byte"],
    [999, "999 bytes"],
    [84_400, "84 kB"],
    [1_300_000, "1.3 MB"],
    [25_000_000, "25 MB"],
  ])("%d are said as people say them", (bytes, words) => {
    expect(sizeText(bytes)).toBe(words);
  });

  it.each(["photo", "scope-picture", "scope-data"] as const)(
    "of a %s: at the limit yes, above and far above no",
    (kind) => {
      const most = FILE_LIMITS.bytes[kind];
      expect(checkSize("a", most, [kind]).ok).toBe(true);
      expect(checkSize("a", most + 1, [kind])).toMatchObject({ error: { code: "too-large" } });
      expect(checkSize("a", Number.MAX_SAFE_INTEGER, [kind])).toMatchObject({ error: { code: "too-large" } });
    },
  );

  it.each([-1, 1.5, NaN, Infinity])("that are none are refused: %d", (bytes) => {
    expect(checkSize("a", bytes, ["photo"])).toMatchObject({ error: { code: "invalid" } });
  });

  it("what may be sent is stated in one line", () => {
    expect(limitsText(["photo"])).toBe("JPEG, PNG or WebP up to 25 MB and 64 megapixels.");
    expect(limitsText(["scope-picture", "scope-data"])).toBe(
      "JPEG, PNG, WebP, GIF or TIFF up to 25 MB and 64 megapixels; scope data as comma, semicolon or tab separated text up to 100 MB.",
    );
  });
});
