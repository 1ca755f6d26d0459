import type { RackBoard, RackUnit, RackView, StageView } from "@/lib/rack/rack-view";
import type { CheckState } from "@/db/schema/travelers";
import { STAGES } from "@/lib/procedure/stages";

const LETTERS: Record<string, CheckState> = {
  p: "passed",
  d: "doubtful",
  f: "failed",
  r: "reopened",
  c: "conceded",
  u: "untested",
  w: "waiting",
};

type Line = {
  code: string;
  name: string;
  detail: string;
  pitchHp: number;
  strips: readonly string[];
  marked?: RackUnit["marked"];
};

/** An invented machine in the middle of its bring-up. One letter a check. */
const LINES: readonly Line[] = [
  {
    code: "SUP",
    name: "Supply entry",
    detail: "5 V and ±12 V",
    pitchHp: 6,
    strips: ["pppp", "pppppp", "ppppp", "ppp", "pp"],
  },
  {
    code: "TIM",
    name: "Timebase",
    detail: "crystal, divider chain",
    pitchHp: 4,
    strips: ["pppp", "pppppppp", "pppp", "pppppp", "ppp"],
  },
  {
    code: "CON",
    name: "Constituent",
    detail: "phase accumulator",
    pitchHp: 4,
    strips: ["pppp", "ppddppppp", "ppdp", "pddpp", "rw"],
  },
  {
    code: "SIN",
    name: "Sine table",
    detail: "two memories, quarter wave",
    pitchHp: 4,
    strips: ["pppp", "pppcpppp", "pppp", "ppfuu", "www"],
    marked: { group: 3, check: 2 },
  },
  {
    code: "OUT",
    name: "Pen driver",
    detail: "converter, servo loop",
    pitchHp: 5,
    strips: ["pppp", "uuuuuu", "wwwww", "wwww", "www"],
  },
];

const board = (line: Pick<Line, "code" | "name" | "detail">, kind: RackBoard["kind"] = "card"): RackBoard => ({
  id: line.code,
  code: line.code,
  name: line.name,
  summary: line.detail,
  kind,
  connectorType: "din41612-c64",
  procedureNumber: 1,
  toMend: 0,
});

function unit(line: Line, kind?: RackBoard["kind"]): RackUnit {
  const stages: StageView[] = STAGES.map(({ id }, index) => ({
    stage: id,
    states: [...(line.strips[index] ?? "")].map((letter) => LETTERS[letter] ?? "untested"),
  }));
  const states = stages.flatMap((stage) => stage.states);
  const count = (...wanted: CheckState[]) => states.filter((state) => wanted.includes(state)).length;
  return {
    id: line.code,
    serial: `${line.code}-01`,
    revision: "A",
    board: board(line, kind),
    stages,
    holding: count("passed", "conceded"),
    total: states.length,
    failing: count("failed"),
    doubtful: count("doubtful"),
    reopened: count("reopened"),
    marked: line.marked ?? null,
  };
}

const slots = LINES.map((line, index) => ({
  id: line.code,
  position: index + 1,
  label: "",
  pitchHp: line.pitchHp,
  board: board(line),
  unit: unit(line),
}));

const spine: Line = {
  code: "BP",
  name: "Backplane",
  detail: "",
  pitchHp: 0,
  strips: ["ppp", "pppppp", "pp", "p", "p"],
};

export const sampleRack: Pick<RackView, "slots" | "backplane"> = {
  slots: [...slots, { id: "empty", position: slots.length + 1, label: "", pitchHp: 4, board: null, unit: null }],
  backplane: { board: board(spine, "backplane"), unit: unit(spine, "backplane") },
};
