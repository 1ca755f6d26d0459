import type { BoardKind } from "@/db/schema/boards";
import type { Stage } from "@/db/schema/procedures";
import type { MachineLayout } from "@/db/schema/projects";
import type { CheckState } from "@/db/schema/travelers";
import type { Outlook } from "@/lib/forecast/say-forecast";

export type StageView = { stage: Stage; states: CheckState[] };

export type RackBoard = {
  id: string;
  code: string;
  name: string;
  summary: string;
  kind: BoardKind;
  connectorType: string | null;
  /** Number of the newest issued procedure; null while there is none. */
  procedureNumber: number | null;
  /** Open findings of the wiring that name this board and must be mended. */
  toMend: number;
};

export type RackUnit = {
  id: string;
  serial: string;
  revision: string;
  board: RackBoard;
  /** All five stages; empty lists when no traveler was started. */
  stages: StageView[];
  holding: number;
  total: number;
  failing: number;
  doubtful: number;
  reopened: number;
  /** The check of this unit that the bench needs first: index of the stage and of the check in it. */
  marked: { group: number; check: number } | null;
};

export type RackSlot = {
  id: string;
  position: number;
  label: string;
  pitchHp: number;
  /** The board it is wired for; null: any. */
  board: RackBoard | null;
  unit: RackUnit | null;
};

export type RackStep = {
  checkId: string;
  unitId: string;
  serial: string;
  stage: Stage;
  title: string;
  state: CheckState;
  /** "Holds back 7 checks." */
  reason: string;
};

export type SinceView = {
  at: string;
  /** From the viewer's last digest, or from Sunday when there was none. */
  from: "digest" | "sunday";
  attempts: number;
  evenings: number;
  firstPasses: number;
  repeats: number;
  failures: number;
  photos: number;
  captures: number;
};

export type RackView = {
  name: string;
  summary: string;
  layout: MachineLayout;
  slots: RackSlot[];
  backplane: { board: RackBoard; unit: RackUnit | null } | null;
  /** Units that sit in no slot. */
  loose: RackUnit[];
  boards: RackBoard[];
  next: RackStep[];
  since: SinceView;
  /** When the rest will hold; null while there is no check. */
  outlook: Outlook | null;
  /** Open findings of the wiring that must be mended, each counted once however many boards it names. */
  toMend: number;
  total: number;
  holding: number;
  failing: number;
  doubtful: number;
  reopened: number;
};
