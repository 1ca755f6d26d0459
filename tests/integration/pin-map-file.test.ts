import { describe, expect, it } from "vitest";
import { pinNamed } from "@/lib/calc/connector";
import { givePinMapFile } from "@/lib/pin-map-file/give-pin-map-file";
import { guessColumns } from "@/lib/pin-map-file/guess-columns";
import { judgeRows } from "@/lib/pin-map-file/judge-rows";
import { loadTakeSources } from "@/lib/pin-map-file/load-take-sources";
import { planTake, type TakePlan } from "@/lib/pin-map-file/plan-take";
import { splitTable } from "@/lib/pin-map-file/split-table";
import { takePinMaps } from "@/lib/pin-map-file/take-pin-maps";
import { takeRows } from "@/lib/pin-map-file/take-rows";
import { withFaces } from "@/lib/pin-map-file/with-faces";
import { takePinMapsInput } from "@/lib/pin-map/schema";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { makeWiredProject, withTwoDrivers, type WiredProject } from "../support/wired-project";

useDatabase();

/** What the page works out before anything is confirmed. */
async function plan(project: WiredProject, text: string): Promise<TakePlan & { bad: number[] }> {
  const { sources, known } = await loadTakeSources(project.scopes.builder);
  const targets = withFaces(sources);
  const split = splitTable(text);
  if (!split.ok) throw new Error(split.sentence);
  const guess = guessColumns(split.table, (cell) => targets.some(({ face }) => pinNamed(face, cell)));
  const judged = judgeRows({ table: split.table, ...guess, targets, chosenId: null, known });
  return { ...planTake(judged.pins, "keep"), bad: judged.bad.map(({ line }) => line) };
}

const confirm = (project: WiredProject, made: TakePlan) =>
  takePinMaps(project.scopes.builder, takePinMapsInput.parse({ ...project.write(), connectors: takeRows(made) }));

async function fileOf(project: WiredProject, connector?: string): Promise<Response> {
  const answer = await givePinMapFile(project.scopes.collaborator, {
    project: project.slug,
    ...(connector === undefined ? {} : { connector }),
  });
  if (!(answer instanceof Response)) throw new Error("no file came");
  return answer;
}
const textOf = async (file: Response) => new TextDecoder("utf-8", { ignoreBOM: true }).decode(await file.arrayBuffer());

describe("a file of pins", () => {
  it("is taken onto several connectors in one change, and the machine is checked with it", async () => {
    const project = await makeWiredProject();
    const text = [
      "Connector,Pin,Signal,Role,Family",
      "BP.X1,a10,PH6,,",
      "BP.X2,a10,PH6,,",
      "TIM.J1,a10,PH6,push-pull output,HC",
      "CON.J1,a10,PH6,push-pull output,HC",
    ].join("\n");
    const made = await plan(project, text);
    expect([made.added, made.bad]).toEqual([4, []]);
    expect(await must(confirm(project, made))).toEqual({ connectors: 4, pins: 4 });
    expect(await project.findings("two-push-pull")).toHaveLength(1);
    expect((await plan(project, text)).unchanged).toBe(4);
  });

  it("with bad rows: the good ones are taken, the bad ones leave no trace", async () => {
    const project = await makeWiredProject();
    const made = await plan(project, "Connector,Pin,Signal\nTIM.J1,a10,PH6\nTIM.J1,a99,PH7\nTIM.J1,a10,PH8\n");
    expect(made.bad).toEqual([3, 4]);
    expect(await must(confirm(project, made))).toEqual({ connectors: 1, pins: 1 });
  });

  it("looked at before somebody else's change is refused whole, with who it was", async () => {
    const project = await makeWiredProject();
    const made = await plan(project, "Connector,Pin,Signal\nCON.J1,a10,PH6\nTIM.J1,a10,PH6\n");
    await project.wire("TIM.J1", [{ pin: "a11", signal: "PH7" }], project.scopes.maintainer);
    expect(await refusal(confirm(project, made))).toMatchObject({
      code: "conflict",
      message: expect.stringContaining("Mira changed TIM J1 meanwhile"),
    });
    const { sources } = await loadTakeSources(project.scopes.builder);
    expect(sources.find(({ board }) => board === "CON")?.kept).toEqual({});
  });

  it("sent twice is taken once", async () => {
    const project = await makeWiredProject();
    const made = await plan(project, "Connector,Pin,Signal\nTIM.J1,a10,PH6\n");
    const input = takePinMapsInput.parse({ ...project.write(), connectors: takeRows(made) });
    const both = [
      await must(takePinMaps(project.scopes.builder, input)),
      await must(takePinMaps(project.scopes.builder, input)),
    ];
    expect(both).toEqual([
      { connectors: 1, pins: 1 },
      { connectors: 1, pins: 1 },
    ]);
    expect((await project.versionOf("TIM.J1")).version).toBe(2);
  });

  it("with a row for a connector of another project takes nothing", async () => {
    const [project, other] = [await makeWiredProject(), await makeWiredProject()];
    const made = await plan(project, "Connector,Pin,Signal\nTIM.J1,a10,PH6\n");
    expect(await refusal(confirm(other, made))).toMatchObject({ code: "not-found" });
  });

  it("of ten thousand rows is looked at in one go", async () => {
    const project = await makeWiredProject();
    const rows = Array.from({ length: 10_000 }, (_, at) => `TIM.J1,a${(at % 32) + 1},S${at}`);
    const made = await plan(project, `Connector,Pin,Signal\n${rows.join("\n")}`);
    expect([made.added, made.bad.length]).toEqual([32, 9_968]);
  });
});

describe("the file that the project gives", () => {
  it("is CSV in UTF-8 to be saved, with formula-looking cells escaped, and comes back identical", async () => {
    const project = await withTwoDrivers();
    await project.wire("TIM.J1", [
      { pin: "b5", signal: "-12V", role: "power" },
      { pin: "b6", signal: "FAULT_N", role: "oc", family: "HCT", pullUpOhm: "4k7" },
    ]);
    const file = await fileOf(project);
    expect(file.headers.get("content-type")).toContain("text/csv; charset=utf-8");
    expect(file.headers.get("content-disposition")).toMatch(/^attachment; filename="[\w.-]+-pin-maps\.csv"$/);
    const text = await textOf(file);
    expect(text).toContain("TIM,J1,b5,'-12V,power");
    expect(text).toContain("TIM,J1,b6,FAULT_N,open-drain output,HCT,,,4.7 kΩ,");
    const again = await plan(project, text);
    expect([again.bad, again.added + again.changed + again.cleared]).toEqual([[], 0]);
  });

  it("fills an empty project of the same connectors with the same pins", async () => {
    const [project, empty] = [await withTwoDrivers(), await makeWiredProject()];
    await must(confirm(empty, await plan(empty, await textOf(await fileOf(project)))));
    expect(await textOf(await fileOf(empty))).toBe(await textOf(await fileOf(project)));
  });

  it("is of one connector when one is named, and of none of another project", async () => {
    const [project, other] = [await withTwoDrivers(), await withTwoDrivers()];
    const text = await textOf(await fileOf(project, project.ids["TIM.J1"]));
    expect(text.split("\r\n")).toHaveLength(1 + 64 + 1);
    const stranger = { project: project.slug, connector: other.ids["TIM.J1"] };
    expect(await givePinMapFile(project.scopes.builder, stranger)).toMatchObject({
      ok: false,
      error: { code: "not-found" },
    });
  });
});
