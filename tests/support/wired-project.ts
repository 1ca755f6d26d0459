import { randomUUID } from "node:crypto";
import { and, eq } from "drizzle-orm";
import { database } from "@/db/client";
import { boards, slots } from "@/db/schema/boards";
import { connectors, ruleFindings } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import { savePinMap } from "@/lib/pin-map/save-pin-map";
import { savePinMapInput } from "@/lib/pin-map/schema";
import { must } from "./bench";
import { one } from "./database";
import { makeProject } from "./project";

export type PinGiven = {
  pin: string;
  signal?: string;
  role?: string;
  family?: string;
  loads?: number;
  pullUpOhm?: string;
};

/** A backplane with two slots and a card meant for each, all with a 64-pin edge connector and nothing on a pin yet. */
export async function makeWiredProject() {
  const project = await makeProject({ roles: ["maintainer", "builder", "collaborator"] });
  const db = database();
  const projectId = project.id;
  const board = async (code: string, kind: "card" | "backplane" = "card") =>
    one(
      await db
        .insert(boards)
        .values({ projectId, code, name: `Board ${code}`, kind })
        .returning(),
    ).id;
  const [backplane, tim, con] = [await board("BP", "backplane"), await board("TIM"), await board("CON")];
  const connector = async (boardId: string, reference: string, position: number, slotId: string | null = null) =>
    one(
      await db
        .insert(connectors)
        .values({ projectId, boardId, reference, position, slotId, type: "din41612-b64" })
        .returning(),
    ).id;
  const slot = async (position: number, boardId: string) =>
    one(await db.insert(slots).values({ projectId, position, boardId }).returning()).id;
  const ids = {
    "BP.X1": await connector(backplane, "X1", 1, await slot(1, tim)),
    "BP.X2": await connector(backplane, "X2", 2, await slot(2, con)),
    "TIM.J1": await connector(tim, "J1", 1),
    "CON.J1": await connector(con, "J1", 1),
  };
  type Place = keyof typeof ids;

  const versionOf = async (place: Place) => {
    const row = one(await db.select().from(connectors).where(eq(connectors.id, ids[place])));
    return { connectorId: row.id, version: row.version };
  };

  /** What a builder types into the editor and saves. */
  async function wire(place: Place, pins: readonly PinGiven[], scope: ProjectScope = project.scopes.builder) {
    const input = { project: project.slug, writeId: randomUUID(), ...(await versionOf(place)), pins };
    return must(savePinMap(scope, savePinMapInput.parse(input)));
  }

  /** The same row on both slots of the backplane: copper from slot to slot. */
  async function bus(...signals: [pin: string, signal: string][]) {
    const pins = signals.map(([pin, signal]) => ({ pin, signal, role: "passive" }));
    await wire("BP.X1", pins);
    await wire("BP.X2", pins);
  }

  const findings = (rule?: string) =>
    db
      .select()
      .from(ruleFindings)
      .where(
        rule === undefined
          ? eq(ruleFindings.projectId, projectId)
          : and(eq(ruleFindings.projectId, projectId), eq(ruleFindings.rule, rule)),
      );

  const write = () => ({ project: project.slug, writeId: randomUUID() });
  return { ...project, ids, versionOf, wire, bus, findings, write };
}

export type WiredProject = Awaited<ReturnType<typeof makeWiredProject>>;

export const GROUNDED: PinGiven[] = [
  { pin: "a1", signal: "GND", role: "ground" },
  { pin: "a2", signal: "+5V", role: "power" },
];

/** Two cards that both drive PH6: one finding that must be mended. */
export async function withTwoDrivers() {
  const project = await makeWiredProject();
  await project.bus(["a1", "GND"], ["a2", "+5V"], ["a10", "PH6"], ["a11", "PH7"]);
  await project.wire("BP.X1", GROUNDED);
  await project.wire("BP.X2", GROUNDED);
  const drives = { pin: "a10", signal: "PH6", role: "push-pull output", family: "HC" };
  await project.wire("TIM.J1", [
    ...GROUNDED,
    drives,
    { pin: "a11", signal: "PH7", role: "push-pull output", family: "HC" },
  ]);
  await project.wire("CON.J1", [
    ...GROUNDED,
    drives,
    { pin: "a11", signal: "PH7", role: "input", family: "HC", loads: 1 },
  ]);
  return project;
}
