import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { boards, slots } from "@/db/schema/boards";
import { connectors, ruleFindings } from "@/db/schema/wiring";
import type { ProjectScope } from "@/lib/access/scope";
import type { ConnectorId } from "@/lib/calc/connector";
import { addConnector } from "@/lib/connector/add-connector";
import { editConnector } from "@/lib/connector/edit-connector";
import { acceptFinding } from "@/lib/finding/accept-finding";
import { savePinMap } from "@/lib/pin-map/save-pin-map";
import { savePinMapInput } from "@/lib/pin-map/schema";
import { saveSignal } from "@/lib/signal/save-signal";
import { saveSignalInput } from "@/lib/signal/schema";
import { eveningAt, type Happening } from "./calendar";
import { granted } from "./granted";
import { CARD_MAPS, SIGNALS, slotMap, type MapLine } from "./pin-map";

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });
const FACE: ConnectorId = "din41612-b64";
const PLUG = { type: FACE, grid: null, slotId: null, takes: "J1", cabledTo: null };

/** All slots are drawn by then; the boards were ordered one after another from here on. */
const MAPPED_DAYS_AGO = 61;

/** Signals, connectors and pin maps of the whole machine, and the one finding that was accepted. */
export function wiringHappenings(db: Database, scope: ProjectScope, now: Date): Happening[] {
  const at = (daysAgo: number, minutes: number) => eveningAt(now, daysAgo, minutes, scope.timeZone);
  return [
    {
      at: at(MAPPED_DAYS_AGO, 5),
      work: async () => {
        for (const { frequency = "", note = "", aliases = [], ...signal } of SIGNALS) {
          const typed = { ...write(scope), ...signal, version: 0, aliases: aliases.join(" "), frequency, note };
          granted(await saveSignal(scope, saveSignalInput.parse(typed)));
        }
      },
    },
    { at: at(MAPPED_DAYS_AGO, 15), work: () => mapBackplane(db, scope) },
    ...Object.entries(CARD_MAPS).map(([code, maps], index) => ({
      at: at(MAPPED_DAYS_AGO, 30 + index),
      work: () => mapCard(db, scope, code, maps),
    })),
    { at: at(MAPPED_DAYS_AGO, 45), work: () => layRibbon(db, scope) },
    { at: at(ACCEPTED_DAYS_AGO, 20), work: () => acceptNeighbours(db, scope) },
  ];
}

const ACCEPTED_DAYS_AGO = 44;

async function boardId(db: Database, scope: ProjectScope, code: string): Promise<string> {
  const [row] = await db
    .select({ id: boards.id })
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.code, code)));
  if (!row) throw new Error(`the demo has no board ${code}`);
  return row.id;
}

async function connectorOf(db: Database, board: string, reference: string) {
  const [row] = await db
    .select()
    .from(connectors)
    .where(and(eq(connectors.boardId, board), eq(connectors.reference, reference)));
  return row;
}

async function mapPins(db: Database, scope: ProjectScope, board: string, reference: string, lines: MapLine[]) {
  const connector = await connectorOf(db, board, reference);
  if (!connector) throw new Error(`the demo has no connector ${reference}`);
  const pins = lines.map(({ pullUp, ...line }) => ({ ...line, pullUpOhm: pullUp }));
  const typed = { ...write(scope), connectorId: connector.id, version: connector.version, pins };
  granted(await savePinMap(scope, savePinMapInput.parse(typed)));
}

async function mapCard(db: Database, scope: ProjectScope, code: string, maps: Record<string, MapLine[]>) {
  const board = await boardId(db, scope, code);
  for (const [reference, lines] of Object.entries(maps)) {
    if (!(await connectorOf(db, board, reference))) {
      granted(await addConnector(scope, { ...write(scope), boardId: board, reference, ...PLUG }));
    }
    await mapPins(db, scope, board, reference, lines);
  }
}

/** X1 stands there since the board was set up; it makes slot 1 like its neighbours make theirs. */
async function mapBackplane(db: Database, scope: ProjectScope) {
  const board = await boardId(db, scope, "BPL");
  const all = await db.select().from(slots).where(eq(slots.projectId, scope.projectId));
  for (const slot of all.sort((a, b) => a.position - b.position)) {
    const reference = `X${slot.position}`;
    const made = { ...PLUG, reference, slotId: slot.id };
    const there = await connectorOf(db, board, reference);
    if (there) {
      const { id: connectorId, version, position } = there;
      granted(await editConnector(scope, { ...write(scope), connectorId, version, position, ...made }));
    } else {
      granted(await addConnector(scope, { ...write(scope), boardId: board, ...made }));
    }
    await mapPins(db, scope, board, reference, slotMap(slot.position));
  }
}

async function layRibbon(db: Database, scope: ProjectScope) {
  const near = await connectorOf(db, await boardId(db, scope, "OUT"), "J3");
  const far = await connectorOf(db, await boardId(db, scope, "PAN"), "J1");
  if (!near || !far) throw new Error("the demo's ribbon has no ends");
  const { id: connectorId, version, position, reference } = near;
  const cable = { ...PLUG, reference, cabledTo: far.id };
  granted(await editConnector(scope, { ...write(scope), connectorId, version, position, ...cable }));
}

async function acceptNeighbours(db: Database, scope: ProjectScope) {
  const all = await db.select().from(ruleFindings).where(eq(ruleFindings.projectId, scope.projectId));
  const found = all.find(({ key, rule }) => rule === "clock-beside-clock" && key.includes("PHI1"));
  if (!found) throw new Error(`no finding about the clocks: ${all.map(({ key }) => key).join(" | ")}`);
  const reason = "Both phases are slow against their length and end in 150 Ω at slot 8. Measured quiet on BPL-01.";
  granted(await acceptFinding(scope, { ...write(scope), key: found.key, facts: found.facts, reason }));
}
