import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  applyEdits,
  assembleNets,
  checkMachine,
  checkRules,
  netFactsOf,
  type Finding,
  type Machine,
} from "@/lib/calc/interconnect";
import { anyGarbage } from "../../support/any-garbage";
import { anyMachine, anyPlainMachine, shuffled } from "../../support/any-machine";

const RUNS = { numRuns: 150 };

describe("the rule check", () => {
  test("answers the same whatever the order of boards, placements, matings, pins and signals", () => {
    fc.assert(
      fc.property(
        anyMachine.chain((machine) => fc.tuple(fc.constant(machine), shuffled(machine))),
        ([machine, mixed]) => {
          expect(checkMachine(mixed)).toEqual(checkMachine(machine));
        },
      ),
      RUNS,
    );
  });

  test("finds a thing no more once its edits are made", () => {
    fc.assert(
      fc.property(anyPlainMachine, (machine) => {
        const before = checkRules(machine);
        for (const finding of before) {
          if (finding.edits.length === 0) continue;
          const left = checkRules(applyEdits(machine, finding.edits));
          // On so few pins an edit can make a list look mirrored or straight; then all else is judged anew.
          if (finding.rule !== "mirrored" && mirroredOf(left) !== mirroredOf(before)) continue;
          expect(left.map(({ key }) => key)).not.toContain(finding.key);
        }
      }),
      RUNS,
    );
  });

  test("tells everything once, the weightiest first, with a title, a reason and a mend", () => {
    fc.assert(
      fc.property(anyMachine, (machine) => {
        const findings = checkRules(machine);
        expect(new Set(findings.map(({ key }) => key)).size).toBe(findings.length);
        const weights = findings.map(({ weight }) => ["must", "should", "look"].indexOf(weight));
        expect(weights).toEqual([...weights].sort());
        for (const { title, why, mend } of findings) {
          for (const sentence of [why, mend]) expect(sentence).toMatch(/.\.$/);
          expect(title).not.toMatch(/undefined|NaN|\[object/);
          expect(why + mend).not.toMatch(/undefined|NaN|Infinity|\[object/);
        }
      }),
      RUNS,
    );
  });

  test("knows a finding by rule, net and boards, never by ids of rows: its key and facts outlive new ids", () => {
    fc.assert(
      fc.property(anyMachine, (machine) => {
        const about = (one: Machine) => checkRules(one).map(({ key, facts }) => ({ key, facts }));
        expect(about(withNewIds(machine))).toEqual(about(machine));
      }),
      RUNS,
    );
  });

  test("never stumbles over what is not there, listed twice or no number", () => {
    fc.assert(
      fc.property(anyGarbage, (machine) => {
        const { nets, findings } = checkMachine(machine);
        const facts = netFactsOf(machine);
        for (const net of nets) expect(facts(net).sentences).toBeInstanceOf(Array);
        for (const finding of findings) expect(applyEdits(machine, finding.edits)).toBeDefined();
      }),
      RUNS,
    );
  });
});

test("the nets are exactly the pins that copper and connectors join", () => {
  fc.assert(
    fc.property(anyMachine, (machine) => {
      const groups = assembleNets(machine).map(({ pins }) =>
        pins.map(({ placement, connectorId, pin }) => `${placement}|${connectorId}|${pin}`).sort(),
      );
      expect(groups.sort()).toEqual(floodedNets(machine).sort());
    }),
    RUNS,
  );
});

test("no two nets have one id", () => {
  fc.assert(
    fc.property(anyMachine, (machine) => {
      const ids = assembleNets(machine).map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
    }),
    RUNS,
  );
});

const mirroredOf = (findings: readonly Finding[]): string =>
  findings
    .filter(({ rule }) => rule === "mirrored")
    .map(({ key, facts }) => key + facts)
    .join();

function withNewIds(machine: Machine): Machine {
  const renamed = (id: string) => `row ${id.length} ${[...id].reverse().join("")}`;
  const end = ({ placement, connector }: { placement: string; connector: string }) => ({
    placement: renamed(placement),
    connector: renamed(connector),
  });
  return {
    ...machine,
    boards: machine.boards.map((board) => ({
      ...board,
      connectors: board.connectors.map((one) => ({ ...one, id: renamed(one.id) })),
    })),
    placements: machine.placements.map((one) => ({ ...one, id: renamed(one.id) })),
    matings: machine.matings.map(({ from, to }) => ({ from: end(from), to: end(to) })),
    draws: machine.draws.map((draw) => ({ ...draw, placement: renamed(draw.placement) })),
  };
}

/** The slow and plain way: from each pin to every pin that it touches, until nothing new comes. */
function floodedNets(machine: Machine): string[][] {
  const pins = machine.placements.flatMap((placement) => {
    const board = machine.boards.find(({ code }) => code === placement.board);
    return (board?.connectors ?? []).flatMap(({ id, pins: own }) =>
      own.map(({ pin, signal, role }) => ({
        placement: placement.id,
        connector: id,
        pin,
        signal: role === "no connection" ? "" : signal,
      })),
    );
  });
  type Pin = (typeof pins)[number];
  const meets = (one: Pin, other: Pin) =>
    machine.matings.some(({ from, to }) =>
      [
        [from, to],
        [to, from],
      ].some(
        ([a, b]) =>
          a?.placement === one.placement &&
          a.connector === one.connector &&
          b?.placement === other.placement &&
          b.connector === other.connector,
      ),
    ) && one.pin === other.pin;
  const touches = (one: Pin, other: Pin) =>
    (one.placement === other.placement && one.signal !== "" && one.signal === other.signal) || meets(one, other);
  const left = new Set(pins);
  const nets: string[][] = [];
  for (const start of pins) {
    if (!left.delete(start)) continue;
    const net = [start];
    for (const pin of net) {
      for (const other of left) {
        if (touches(pin, other)) {
          left.delete(other);
          net.push(other);
        }
      }
    }
    nets.push(net.map(({ placement, connector, pin }) => `${placement}|${connector}|${pin}`).sort());
  }
  return nets;
}
