import { describe, expect, it } from "vitest";
import { loadSignals } from "@/lib/signal/load-signals";
import { removeSignal } from "@/lib/signal/remove-signal";
import { saveSignal } from "@/lib/signal/save-signal";
import { saveSignalInput } from "@/lib/signal/schema";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { withTwoDrivers, type WiredProject } from "../support/wired-project";

useDatabase();

const NOTHING = { version: 0, class: "data" as const, aliases: "", frequency: "", note: "" };
type Given = { name: string } & Partial<typeof NOTHING | { class: "clock" }>;

const save = (project: WiredProject, given: Given) =>
  saveSignal(project.scopes.builder, saveSignalInput.parse({ ...project.write(), ...NOTHING, ...given }));

const signalOf = async (project: WiredProject, name: string) =>
  (await loadSignals(project.scopes.builder)).find((signal) => signal.name === name);

describe("a signal", () => {
  it("is listed as soon as a pin carries it, with its pins and boards", async () => {
    expect(await signalOf(await withTwoDrivers(), "PH6")).toMatchObject({
      class: "data",
      version: 0,
      pins: 4,
      boards: ["BP", "CON", "TIM"],
    });
  });

  it("gets a class, other names and a frequency as people write it", async () => {
    const project = await withTwoDrivers();
    const given = {
      name: "PH6",
      class: "clock" as const,
      aliases: "PHASE6, P6",
      frequency: "1.5 MHz",
      note: "From the divider",
    };
    expect(await must(save(project, given))).toEqual({ version: 1 });
    expect(await signalOf(project, "PH6")).toMatchObject({
      class: "clock",
      aliases: ["PHASE6", "P6"],
      frequencyHz: 1.5e6,
      note: "From the divider",
    });
  });

  it("may share another name with its neighbour, as a card's select in every slot does, but not take it as its own", async () => {
    const project = await withTwoDrivers();
    await must(save(project, { name: "PH6", aliases: "P6" }));
    await must(save(project, { name: "PH7", aliases: "P6" }));
    expect((await refusal(save(project, { name: "P6" }))).fields).toEqual({
      name: expect.stringMatching(/^P6 is another name of PH[67] already. Take it away there first.$/),
    });
  });

  it("that differs from another one only in case is refused, with the name that is meant", async () => {
    const project = await withTwoDrivers();
    expect((await refusal(save(project, { name: "ph6" }))).fields).toEqual({
      name: "The pins carry PH6, which differs from ph6 only in case. Write it as the pins do.",
    });
  });

  it("an edit of a stale version is refused with what stands there now", async () => {
    const project = await withTwoDrivers();
    await must(save(project, { name: "PH6", note: "first" }));
    expect(await refusal(save(project, { name: "PH6", note: "second" }))).toMatchObject({
      code: "conflict",
      details: { current: { note: "first", version: 1 } },
    });
  });

  it("two who say the first word at once: one is kept, the other is told", async () => {
    const project = await withTwoDrivers();
    const both = await Promise.all(["one", "other"].map((note) => save(project, { name: "PH6", note })));
    expect(both.filter(({ ok }) => ok)).toHaveLength(1);
    expect(both.find(({ ok }) => !ok)).toMatchObject({ error: { code: "conflict" } });
  });

  it("loses what was said of it, and stays on its pins", async () => {
    const project = await withTwoDrivers();
    await must(save(project, { name: "PH6", note: "gone soon" }));
    await must(removeSignal(project.scopes.builder, { ...project.write(), name: "PH6", version: 1 }));
    expect(await signalOf(project, "PH6")).toMatchObject({ note: "", version: 0, pins: 4 });
  });
});

describe("what is agreed on", () => {
  it("mends a finding: another name of the same net is no mistake", async () => {
    const project = await withTwoDrivers();
    await project.wire("CON.J1", [{ pin: "a11", signal: "PHASE7", role: "input", family: "HC" }]);
    expect(await project.findings("named-differently")).toHaveLength(1);
    await must(save(project, { name: "PH7", aliases: "PHASE7" }));
    expect(await project.findings("named-differently")).toEqual([]);
  });
});
