import fc from "fast-check";
import type { CheckHistory } from "@/lib/check/check-history";

type Given = Partial<CheckHistory> & { id: string };

/** A check of unit PSU-01 that nothing is known of, unless said otherwise. */
export function history(given: Given): CheckHistory {
  return {
    unitId: "psu",
    serial: "PSU-01",
    stage: "power-on",
    title: given.id,
    position: 1,
    holdPoint: false,
    lifted: false,
    needs: [],
    last: null,
    failedArrival: null,
    reopened: null,
    reworked: null,
    concessions: [],
    ...given,
  };
}

const arrival = fc.integer({ min: 1, max: 60 });

/** Machines of three units; a check needs only checks made before it, so the graph has no circle. */
export const machines: fc.Arbitrary<CheckHistory[]> = fc
  .array(
    fc.record({
      unit: fc.constantFrom("PSU", "TIM", "SUM"),
      holdPoint: fc.boolean(),
      lifted: fc.boolean(),
      needs: fc.array(fc.nat(30), { maxLength: 3 }),
      last: fc.option(
        fc.record({
          arrival,
          verdict: fc.constantFrom("conforms" as const, "guard-band" as const, "does-not-conform" as const),
        }),
      ),
      earlierFailure: fc.option(arrival),
      reopened: fc.option(arrival),
      reworked: fc.option(arrival),
      conceded: fc.boolean(),
    }),
    { maxLength: 24 },
  )
  .map((drawn) =>
    drawn.map((one, index) => {
      const id = `c${String(index).padStart(2, "0")}`;
      const last = one.last ? { id: `${id}-last`, ...one.last } : null;
      const failures = [one.earlierFailure ?? 0, last?.verdict === "does-not-conform" ? last.arrival : 0].filter(
        (at) => last !== null && at > 0 && at <= last.arrival,
      );
      return history({
        id,
        unitId: one.unit,
        serial: `${one.unit}-01`,
        position: index,
        holdPoint: one.holdPoint,
        lifted: one.lifted,
        needs: [
          ...new Set(one.needs.filter((need) => need < index).map((need) => `c${String(need).padStart(2, "0")}`)),
        ],
        last,
        failedArrival: failures.length > 0 ? Math.max(...failures) : null,
        reopened: one.reopened ? { afterArrival: one.reopened, reason: "again" } : null,
        reworked: one.reworked ? { afterArrival: one.reworked, reason: "R1 touched it." } : null,
        concessions: one.conceded && last ? [{ attemptId: last.id, reason: "good enough" }] : [],
      });
    }),
  );
