import { describe, expect, it } from "vitest";
import { byDay } from "@/components/log/by-day";
import { excerpt, picturesBesideText, withoutPicture } from "@/components/log/excerpt";

describe("an entry in the stream", () => {
  it("is shown whole when it is short", () => {
    expect(excerpt("Short.")).toEqual({ text: "Short.", isWhole: true });
  });

  it("is cut between paragraphs, and between words when there is no other way", () => {
    const first = "word ".repeat(80).trim();
    expect(excerpt(`${first}\n\n${first}`, 500)).toEqual({ text: first, isWhole: false });
    expect(excerpt("word ".repeat(200), 100).text).toMatch(/word…$/);
  });

  it("closes a listing that was cut in the middle", () => {
    expect(excerpt(`${"a".repeat(60)}\n\`\`\`\n${"line\n".repeat(100)}\`\`\``, 100).text).toMatch(/```$/);
  });

  it("shows beneath the text only the pictures that are not in it", () => {
    const pictures = [{ id: "one" }, { id: "two" }];
    expect(picturesBesideText("see ![](/api/projects/x/files/one?size=large)", pictures)).toEqual([{ id: "two" }]);
  });

  it("no longer shows a picture that was left out of it", () => {
    const body = "Before\n\n![the ribbon](/api/projects/x/files/one?size=large)\n\n![](/api/projects/x/files/two)";
    expect(withoutPicture(body, "one")).toBe("Before\n\n![](/api/projects/x/files/two)");
  });

  it("falls on the day of the reader's own zone", () => {
    const items = [{ at: "2026-02-03T23:30:00Z" }, { at: "2026-02-03T22:30:00Z" }];
    expect(byDay(items, "Europe/Berlin").map((day) => day.label)).toEqual(["Wed 4 Feb 2026", "Tue 3 Feb 2026"]);
    expect(byDay(items, "UTC").map((day) => [day.label, day.items.length])).toEqual([["Tue 3 Feb 2026", 2]]);
  });
});
