import { TZDate } from "@date-fns/tz";
import { getISODay } from "date-fns";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { nextDue } from "@/lib/digest/next-due";

const HOUR = 3_600_000;
const zone = fc.constantFrom(
  "UTC",
  "Europe/Berlin",
  "America/New_York",
  "America/St_Johns",
  "America/Havana",
  "Africa/Cairo",
  "Asia/Kathmandu",
  "Australia/Lord_Howe",
  "Pacific/Apia",
  "Pacific/Kiritimati",
);
const rule = fc.record({ weekday: fc.integer({ min: 1, max: 7 }), hour: fc.integer({ min: 0, max: 23 }), zone });
const instant = fc.date({ min: new Date("2015-01-01"), max: new Date("2040-01-01"), noInvalidDate: true });

describe("when the next weekly mail is due", () => {
  it("is later than now and at most a week and an hour away", () => {
    fc.assert(
      fc.property(rule, instant, (given, now) => {
        const wait = nextDue(given, now).getTime() - now.getTime();
        expect(wait).toBeGreaterThan(0);
        expect(wait).toBeLessThanOrEqual(169 * HOUR);
      }),
    );
  });

  it("is that weekday at that hour, unless the clocks skip the hour", () => {
    fc.assert(
      fc.property(rule, instant, (given, now) => {
        const due = new TZDate(nextDue(given, now), given.zone);
        expect(getISODay(due)).toBe(given.weekday);
        expect(due.getHours() - given.hour).toBeOneOf([0, 1]);
        if (due.getHours() !== given.hour) {
          const before = new TZDate(due.getTime() - HOUR, given.zone);
          expect(before.getTimezoneOffset()).not.toBe(due.getTimezoneOffset());
        }
      }),
    );
  });

  it("comes about 52 times a year, once in each local week", () => {
    fc.assert(
      fc.property(rule, instant, (given, now) => {
        let due = now;
        for (let week = 0; week < 60; week += 1) {
          const next = nextDue(given, due);
          if (week > 0) {
            const gap = (next.getTime() - due.getTime()) / HOUR;
            expect(gap).toBeGreaterThanOrEqual(166);
            expect(gap).toBeLessThanOrEqual(170);
          }
          due = next;
        }
      }),
      { numRuns: 40 },
    );
  });

  it("is the same from any moment between two dues", () => {
    fc.assert(
      fc.property(rule, instant, fc.double({ min: 0, max: 1, noNaN: true }), (given, now, part) => {
        const due = nextDue(given, now);
        const between = new Date(Math.floor(now.getTime() + part * (due.getTime() - 1 - now.getTime())));
        expect(nextDue(given, between)).toEqual(due);
      }),
    );
  });
});
