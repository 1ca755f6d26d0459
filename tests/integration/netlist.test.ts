import { describe, expect, it } from "vitest";
import { database } from "@/db/client";
import { findNetlist } from "@/db/queries/netlists";
import { keepNetlist } from "@/lib/netlist/keep-netlist";
import { loadNetlists } from "@/lib/netlist/load-netlists";
import { keepNetlistInput } from "@/lib/netlist/schema";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { must, refusal } from "../support/bench";
import { keep, keepInput, SIX_NETS } from "../support/probing";
import { makeBoard, makeProject } from "../support/project";

async function boardOf() {
  const project = await makeProject<"maintainer" | "builder">({ roles: ["maintainer", "builder"] });
  const board = await makeBoard(project, "CON", [{ title: "Look it over", stage: "inspection" }]);
  return { project, board, scope: project.scopes.builder };
}

const NOTHING = { before: undefined, after: undefined };

describe("Netlists of a revision", () => {
  it("every file is a version of its own, and the ones before stay as they were", async () => {
    const { scope, board } = await boardOf();
    const first = await keep(scope, board.revisionId);
    const second = await keep(scope, board.revisionId, `${SIX_NETS}\nG,J1,7\nG,J2,7`);
    expect([first.number, second.number]).toEqual([1, 2]);
    const view = await loadNetlists(scope, "CON", NOTHING);
    expect(view?.versions.map(({ number, nets, points }) => [number, nets, points])).toEqual([
      [2, 7, 20],
      [1, 6, 18],
    ]);
    const kept = await findNetlist(database(), scope, first.id);
    expect(storedNetlist(kept?.netlist.content).nets.map(({ name }) => name)).toEqual(["A", "B", "C", "D", "E", "F"]);
  });

  it("sending the same file again under the same id keeps it once", async () => {
    const { scope, board } = await boardOf();
    const input = keepInput(scope, board.revisionId);
    const [one, two] = [await must(keepNetlist(scope, input)), await must(keepNetlist(scope, input))];
    expect(two).toEqual(one);
    expect((await loadNetlists(scope, "CON", NOTHING))?.versions).toHaveLength(1);
  });

  it("two people who take a file at once get two numbers", async () => {
    const { scope, board, project } = await boardOf();
    const both = await Promise.all([keep(scope, board.revisionId), keep(project.scopes.maintainer, board.revisionId)]);
    expect(both.map(({ number }) => number).sort()).toEqual([1, 2]);
  });

  it("compared: a net gained, one renamed and a pin that moved are named", async () => {
    const { scope, board } = await boardOf();
    const before = await keep(scope, board.revisionId);
    const changed = SIX_NETS.replace("A,U1,1", "B,U1,1").replaceAll("F,", "FF,");
    const after = await keep(scope, board.revisionId, `${changed}\nG,J1,7\nG,J2,7`);
    const view = await loadNetlists(scope, "CON", { before: before.id, after: after.id });
    expect(view?.difference).toMatchObject({
      gained: { count: 1, shown: ["G"] },
      lost: { count: 0 },
      renamed: { shown: [{ from: "F", to: "FF" }] },
      moved: { shown: [{ pin: "U1-1", from: "A", to: "B" }] },
    });
  });

  it("lines that count for nothing are kept with their reason", async () => {
    const { scope, board } = await boardOf();
    await keep(scope, board.revisionId, `${SIX_NETS}\nG,J1\nA,J1,1`);
    const view = await loadNetlists(scope, "CON", NOTHING);
    expect(view?.versions[0]?.passedOver.map(({ line }) => line)).toEqual([19, 20]);
  });

  it("a file without a net, a revision of somebody else and a board without a pin map are refused with a sentence", async () => {
    const { scope, board } = await boardOf();
    const other = await boardOf();
    const empty = await refusal(keepNetlist(scope, keepInput(scope, board.revisionId, "no,,\n,,")));
    expect(empty).toMatchObject({ code: "invalid", message: expect.stringContaining("Nothing was kept.") });
    const foreign = await refusal(keepNetlist(scope, keepInput(scope, other.board.revisionId)));
    expect(foreign.code).toBe("not-found");
    const given = { source: "pin-map" };
    const input = { project: scope.slug, writeId: crypto.randomUUID(), revisionId: board.revisionId, given };
    const bare = await refusal(keepNetlist(scope, keepNetlistInput.parse(input)));
    expect(bare.message).toBe("The pin map of CON names no signal yet. Nothing was kept.");
  });
});
