import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { holds, type StandingCheck } from "@/lib/calc/check-graph";
import { orderChecks, scheduleChecks } from "@/lib/calc/sequence";
import { blockers, PACES, SECONDS } from "../../support/open-blockers";
import { travelers } from "../../support/standing-checks";

describe("A plan", () => {
  const requests = fc.record({ builders: fc.constantFrom<1 | 2>(1, 2), seconds: fc.integer({ min: 0, max: 4000 }) });
  const plan = (checks: readonly StandingCheck[], request: { builders: 1 | 2; seconds: number }) => {
    const answer = scheduleChecks(checks, request, PACES);
    if (!answer.ok) throw new Error(answer.message);
    return answer.value;
  };

  test("begins no check before all that it waits for is done, and ends in time", () => {
    fc.assert(
      fc.property(travelers, requests, (checks, request) => {
        const { lines, left } = plan(checks, request);
        const edges = blockers(checks);
        const ends = new Map(lines.map(({ checkId, endS }) => [checkId, endS]));
        expect(ends.size).toBe(lines.length);
        expect(left).toBe(edges.size - lines.length);
        for (const { checkId, startS, endS } of lines) {
          expect(endS).toBeLessThanOrEqual(request.seconds);
          for (const need of edges.get(checkId) ?? []) expect(ends.get(need) ?? Infinity).toBeLessThanOrEqual(startS);
        }
      }),
    );
  });

  test("gives nobody two checks at once, no board to two people, and the rack to one", () => {
    fc.assert(
      fc.property(travelers, requests, (checks, request) => {
        const byId = new Map(checks.map((check) => [check.id, check]));
        const { lines } = plan(checks, request);
        for (const one of lines) {
          expect(one.builder).toBeLessThanOrEqual(request.builders);
          for (const other of lines) {
            if (one === other || one.endS <= other.startS || other.endS <= one.startS) continue;
            const [a, b] = [byId.get(one.checkId), byId.get(other.checkId)];
            expect(one.builder).not.toBe(other.builder);
            expect(a?.unitId).not.toBe(b?.unitId);
            expect([a?.stage, b?.stage]).not.toEqual(["integration", "integration"]);
          }
        }
      }),
    );
  });

  test("with time enough does everything: alone without a pause, together no faster than the longest chain", () => {
    fc.assert(
      fc.property(travelers, (checks) => {
        const work = checks.filter(({ state }) => !holds(state)).reduce((sum, { stage }) => sum + SECONDS[stage], 0);
        const ordered = orderChecks(checks, PACES);
        const chain = (ordered.ok && ordered.value.critical?.totalS) || 0;
        const [alone, together] = ([1, 2] as const).map((builders) => plan(checks, { builders, seconds: 1e6 }));
        expect(alone).toMatchObject({ left: 0, usedS: work });
        expect(together?.left).toBe(0);
        expect(together?.usedS).toBeLessThanOrEqual(work);
        expect(together?.usedS).toBeGreaterThanOrEqual(Math.max(work / 2, chain));
      }),
    );
  });
});
