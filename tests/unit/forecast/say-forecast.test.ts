import { describe, expect, it } from "vitest";
import type { Week } from "@/lib/calc/forecast";
import { countSessions } from "@/lib/forecast/count-sessions";
import { forecastWork } from "@/lib/forecast/forecast-work";
import { sayForecast } from "@/lib/forecast/say-forecast";

const week: Week = { startMs: 0, gained: 1, lost: 0, repeats: 0, sessions: 1 };
const at = (day: string) => Date.parse(`${day}T22:30:00Z`);
const by = (day: string, sessions: number | null = 9) => ({ atMs: at(day), sessions });
const found = { kind: "forecast" as const, weeks: [week], perWeek: 1, sentence: "9 checks are left." };

describe("the line of the forecast", () => {
  it("says how many evenings are left and by when, with the day of the week in the reader's zone", () => {
    const said = sayForecast({ ...found, half: by("2027-01-15"), most: by("2027-02-01", 12) }, "Europe/Berlin");
    expect(said.line).toBe("About 9 evenings left: 50 % by Fri 15 Jan 2027, 85 % by Mon 1 Feb 2027.");
    expect(said.span).toBe("15 Jan to 1 Feb 2027");
    const later = sayForecast({ ...found, half: by("2027-01-15"), most: by("2027-02-01", 12) }, "Asia/Tokyo");
    expect(later.line).toContain("50 % by Sat 16 Jan 2027");
  });

  it("writes a month once, and both years where they differ", () => {
    const span = (from: string, to: string) => sayForecast({ ...found, half: by(from), most: by(to) }, "UTC").span;
    expect(span("2027-03-14", "2027-03-29")).toBe("14 to 29 Mar 2027");
    expect(span("2026-12-30", "2027-01-09")).toBe("30 Dec 2026 to 9 Jan 2027");
    expect(span("2027-03-14", "2027-03-14")).toBe("14 Mar 2027");
  });

  it("says so where there is no late date, no session, and too little history", () => {
    expect(sayForecast({ ...found, half: by("2027-01-15", null), most: null }, "UTC").line).toBe(
      "50 % by Fri 15 Jan 2027, no date for 85 %.",
    );
    const short = sayForecast({ kind: "not enough history", weeks: [week, week], sentence: "" }, "UTC");
    expect(short.line).toBe("Not enough history: 2 of 3 weeks.");
  });
});

describe("the sessions that are counted", () => {
  it("are those started by hand and the visits in none of them", () => {
    const sessions = countSessions({
      visits: [
        ["ada", 100, 200],
        ["ada", 900, 950],
        ["ben", 120, 130],
      ],
      typed: [["ada", 50, 300]],
    });
    expect(sessions.map(({ builder, startMs, typed }) => [builder, startMs, typed])).toEqual([
      ["ada", 50, true],
      ["ben", 120, false],
      ["ada", 900, false],
    ]);
  });
});

describe("the forecast of a project", () => {
  const day = 86_400_000;
  const start = Date.parse("2026-06-01T00:00:00Z");
  const turns = Array.from({ length: 70 }, (_, index): [number, number, "conforms"] => {
    return [start + index * day + (index % 5) * 3_600_000, index, "conforms"];
  });
  const history = { turns, visits: [], typed: [] };
  const on = (instant: string, projectId = "0526a02a-ca42-45be-a8eb-9036721ce151") =>
    forecastWork({ projectId, history, remaining: 20, now: new Date(instant) });

  it("does not jump when one looks again later the same day", () => {
    expect(on("2026-08-10T21:59:59Z")).toEqual(on("2026-08-10T06:00:00Z"));
  });

  it("counts about a check a day where each day brought one", () => {
    const found20 = on("2026-08-10T12:00:00Z");
    if (found20.kind !== "forecast") throw new Error(found20.sentence);
    const days = (found20.half.atMs - Date.parse("2026-08-10T00:00:00Z")) / day;
    expect(days).toBeGreaterThan(19);
    expect(days).toBeLessThan(21);
  });
});
