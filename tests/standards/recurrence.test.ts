import { describe, expect, it } from "vitest";
import { localInstant } from "@/lib/digest/local-instant";
import { nextDue } from "@/lib/digest/next-due";

const HOUR = 3_600_000;
const at = (text: string, zone: string) => {
  const [year = 0, month = 0, day = 0, hour = 0, minute = 0] = text.split(/\D/).map(Number);
  return localInstant({ year, month, day, hour, minute }, zone).toISOString();
};

describe("RFC 5545 section 3.3.5, local times that the clocks skip or repeat", () => {
  it.each([
    // The RFC's own two examples.
    ["2007-11-04 01:30", "America/New_York", "2007-11-04T05:30:00.000Z"],
    ["2007-03-11 02:30", "America/New_York", "2007-03-11T07:30:00.000Z"],
    ["2026-03-29 02:30", "Europe/Berlin", "2026-03-29T01:30:00.000Z"],
    ["2026-10-25 02:30", "Europe/Berlin", "2026-10-25T00:30:00.000Z"],
    // Half an hour only, the other hemisphere: 02:00 to 02:30 is skipped, 01:30 to 02:00 comes twice.
    ["2026-10-04 02:15", "Australia/Lord_Howe", "2026-10-03T15:45:00.000Z"],
    ["2026-04-05 01:45", "Australia/Lord_Howe", "2026-04-04T14:45:00.000Z"],
    // A whole day that never was.
    ["2011-12-30 12:00", "Pacific/Apia", "2011-12-30T22:00:00.000Z"],
  ])("%s in %s is %s", (local, zone, instant) => {
    expect(at(local, zone)).toBe(instant);
  });
});

describe("a weekly mail, Mondays at 09:00 in Berlin", () => {
  const rule = { weekday: 1, hour: 9, zone: "Europe/Berlin" };
  const chain = (from: string, count: number) => {
    const dues: Date[] = [];
    for (let last = new Date(from); dues.length < count; last = dues.at(-1) ?? last) dues.push(nextDue(rule, last));
    return dues.map((due) => due.toISOString().slice(0, 16));
  };

  it("stays at nine when summer time begins, 167 hours later", () => {
    expect(chain("2026-03-20T00:00:00Z", 2)).toEqual(["2026-03-23T08:00", "2026-03-30T07:00"]);
    expect(Date.parse("2026-03-30T07:00Z") - Date.parse("2026-03-23T08:00Z")).toBe(167 * HOUR);
  });

  it("stays at nine when summer time ends, 169 hours later", () => {
    expect(chain("2026-10-15T00:00:00Z", 2)).toEqual(["2026-10-19T07:00", "2026-10-26T08:00"]);
  });

  it("is not the week of 168 hours, which would come at ten", () => {
    const wrong = new Date(Date.parse("2026-03-23T08:00Z") + 168 * HOUR);
    expect(nextDue(rule, new Date("2026-03-23T08:00Z"))).not.toEqual(wrong);
  });

  it("is never the instant one starts from", () => {
    expect(nextDue(rule, new Date("2026-03-23T08:00:00Z")).toISOString()).toBe("2026-03-30T07:00:00.000Z");
    expect(nextDue(rule, new Date("2026-03-23T07:59:59Z")).toISOString()).toBe("2026-03-23T08:00:00.000Z");
  });
});
