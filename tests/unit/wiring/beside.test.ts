import { describe, expect, test } from "vitest";
import { partsOf, labelsOf, driversOf } from "@/components/wiring/beside/net-words";
import {
  countsSentence,
  shownFindings,
  splitByConnector,
  weightsByPin,
} from "@/components/wiring/beside/shown-findings";
import { litAt, stationsOf } from "@/components/wiring/beside/stations";
import { changedPins } from "@/components/wiring/check/changed-pins";
import { checkChanged } from "@/components/wiring/check/check-changed";
import { applyChanges, shownTexts } from "@/components/wiring/draft/pin-drafts";
import { canBeDoneHere, changesOfEdits } from "@/components/wiring/editor/edit-changes";
import { keptMapOf } from "@/components/wiring/editor/kept-map";
import type { FindingView } from "@/lib/finding/load-findings";
import { netsByPin, type Finding, type MachineCheck } from "@/lib/calc/interconnect";
import { connectorViews, rack, SLOTS } from "./machine";

const machine = rack();
const connectors = connectorViews();
const check = checkChanged(machine, {});
const known = { families: machine.families.map(({ name }) => name), rails: ["+5V"] };
const drivers = check.findings.find(({ title }) => title.includes("push-pull outputs drive PH6"));
if (!drivers) throw new Error("Two cards that drive one net are found.");

const stored = (finding: Finding, accepted: FindingView["accepted"]): FindingView => ({
  ...finding,
  foundAt: "2026-12-01T10:00:00Z",
  accepted,
});
const acceptance = { by: "Mira", at: "2026-12-01T10:00:00Z", reason: "Never on at once." };

describe("the findings beside the table", () => {
  test("are the stored ones until the first check has answered, then the newest", () => {
    expect(shownFindings(undefined, [stored(drivers, null)]).map(({ key }) => key)).toEqual([drivers.key]);
    expect(shownFindings(check, []).map(({ key }) => key)).toEqual(check.findings.map(({ key }) => key));
  });

  test("stay accepted as long as they rest upon the same facts", () => {
    const one = (facts: string): MachineCheck => ({ nets: [], findings: [{ ...drivers, facts }] });
    const shown = (facts: string) => shownFindings(one(facts), [stored(drivers, acceptance)])[0];
    expect(shown(drivers.facts)?.accepted).toEqual(acceptance);
    expect(shown("another family")).toMatchObject({ accepted: null, stored: undefined });
  });

  test("are counted in a sentence", () => {
    const of = (weight: Finding["weight"], accepted: FindingView["accepted"] = null) => ({
      ...{ ...drivers, weight },
      ...{ accepted, stored: undefined },
    });
    expect(countsSentence([of("must"), of("must"), of("should"), of("look", acceptance)])).toBe(
      "2 must be mended, 1 should be, 1 accepted.",
    );
    expect(countsSentence([of("should"), of("look")])).toBe("1 should be mended, 1 worth a look.");
    expect(countsSentence([])).toBe("nothing is found.");
  });

  test("mark their pins, accepted ones not; the connector's own stand first", () => {
    const shown = shownFindings(check, []);
    expect(weightsByPin(shown)("j1", "a10")).toBe("must");
    expect(weightsByPin(shown)("j1", "a11")).toBeUndefined();
    expect(weightsByPin(shown.map((one) => ({ ...one, accepted: acceptance })))("j1", "a10")).toBeUndefined();
    expect(splitByConnector(shown, "x3").here.map(({ key }) => key)).not.toContain(drivers.key);
    expect(splitByConnector(shown, undefined).elsewhere).toEqual([]);
  });

  test("that the pins can mend are gone when one does what they say", () => {
    const kept = keptMapOf({ machine, connectors });
    expect(canBeDoneHere(drivers.edits)).toBe(true);
    expect(canBeDoneHere([{ kind: "alias", signal: "A", alias: "B" }])).toBe(false);
    const changes = changesOfEdits(drivers.edits, (id, pin) => shownTexts(kept, {}, id, pin));
    const drafts = applyChanges({}, kept, changes);
    const again = checkChanged(machine, changedPins(kept, { kept, drafts }, known));
    expect(again.findings.map(({ key }) => key)).not.toContain(drivers.key);
  });
});

describe("the net of a pin", () => {
  const net = netsByPin(check.nets)({ placement: "slot 1", connectorId: "j1", pin: "a10" });
  if (!net) throw new Error("a10 is on a net.");

  test("says who drives it and who only passes it on", () => {
    expect(partsOf(net).map(({ words, pins }) => `${words} ${labelsOf(pins)}`)).toEqual([
      "driven by CON in slot 2, CON-01",
      "passed on by BP-01",
    ]);
    expect(labelsOf(driversOf(net), 1)).toBe("2 boards");
  });

  test("is lit at every slot that it touches, the slot's pin and the card's as one", () => {
    const stations = stationsOf({ machine, connectors, slots: SLOTS });
    expect(stations.map(({ label, who }) => `${label} ${who}`)).toEqual(["slot 1 CON-01", "slot 2 CON", "slot 3 "]);
    expect(stations.map((station) => litAt(station, net))).toEqual([["a10"], ["a10"], []]);
    expect(stations.map((station) => litAt(station, undefined))).toEqual([[], [], []]);
  });
});

describe("what the check sees of what is typed", () => {
  const kept = keptMapOf({ machine, connectors });
  const typed = (pin: string, column: "signal" | "role", after: string) =>
    applyChanges({}, kept, [{ connectorId: "j1", pin, column, before: "", after }]);

  test("is the row as it would be saved", () => {
    const pins = changedPins(kept, { kept, drafts: typed("a12", "signal", "GND") }, known).j1;
    expect(pins).toContainEqual(expect.objectContaining({ pin: "a12", signal: "GND", role: "ground" }));
    expect(pins).toHaveLength(2);
  });

  test("is the kept cell where the typed one cannot be read", () => {
    const pins = changedPins(kept, { kept, drafts: typed("a10", "role", "outputt") }, known).j1;
    expect(pins).toEqual([expect.objectContaining({ pin: "a10", role: "push-pull output" })]);
  });

  test("is nothing of connectors that stand as they were loaded, and all of one that was saved since", () => {
    expect(changedPins(kept, { kept, drafts: {} }, known)).toEqual({});
    const saved = { ...kept, j1: { version: 2, rows: {} } };
    expect(changedPins(kept, { kept: saved, drafts: {} }, known)).toEqual({ j1: [] });
  });
});
