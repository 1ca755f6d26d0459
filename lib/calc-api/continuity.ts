import {
  findContinuityFaults,
  planProbes,
  pointBook,
  PROBE_LIMIT_CLASSES,
  type PlanOptions,
  type ProbeLimits,
} from "@/lib/calc/continuity";
import { readIpcD356, type Netlist } from "@/lib/calc/netlist";
import type { z } from "zod";
import { continuityInput, MOST_POINTS, netlistOf } from "./continuity-input";
import { countClosePairs } from "./count-close-pairs";
import { defineCalculation, type Outcome } from "./define-calculation";

/** More would keep the server busy for too long for one request. */
const MOST_PAIRS = 50_000;

type Given = z.output<typeof continuityInput>;

const at = (part: string, pin: string, xMm: number, yMm: number) => ({ part, pin, xMm, yMm });

export const continuity = defineCalculation({
  name: "continuity",
  about:
    "Which pairs of points to probe on a board, in which order, and what the results say: opens, shorts, crossed wires.",
  source:
    "Limits: IPC-9252, classes 3 and 3/A as trade articles give them, 1 and 2 from memory. Files: IPC-D-356 and 356A. The standards were not opened; see the project's check values. Nearest neighbour, then 2-opt: common practice.",
  leavesOut: "Shorts between nets that are nowhere beside each other, and parts that join nets on a board with parts.",
  most: `${MOST_POINTS} points, ${MOST_PAIRS} pairs beside each other.`,
  input: continuityInput,
  example: {
    nets: [
      { name: "GND", points: [at("J1", "a1", 0, 0), at("U1", "7", 20, 5), at("U2", "7", 40, 5)] },
      { name: "+5V", points: [at("J1", "a2", 0, 2.54), at("U1", "14", 20, 12)] },
      { name: "CLK", points: [at("J1", "a3", 0, 5.08), at("U1", "1", 12, 5)] },
    ],
    limits: "1",
    results: [{ probe: 0, beeps: false }],
  },
  run: (given): Outcome => {
    const read = readNetlist(given);
    if (!read.ok) return read;
    const { netlist } = read;
    const book = pointBook(netlist);
    if (book.points.length > MOST_POINTS) {
      return {
        ok: false,
        fields: { ipcD356: `It has ${book.points.length} points; at most ${MOST_POINTS} are planned.` },
      };
    }
    if (countClosePairs(book, given.rails) > MOST_PAIRS) {
      const message = `More than ${MOST_PAIRS} pairs of points lie beside each other or are rails. Are the places in millimetres?`;
      return { ok: false, fields: { [given.ipcD356 === "" ? "nets" : "ipcD356"]: message } };
    }
    const { probes, ...plan } = planProbes(netlist, optionsOf(given));
    const stray = given.results.findIndex(({ probe }) => probe >= probes.length);
    if (stray >= 0) {
      const message = `There is no probe ${given.results[stray]?.probe}: this plan has ${probes.length}.`;
      return { ok: false, fields: { [`results.${stray}.probe`]: message } };
    }
    const end = (point: number) => ({ net: book.netName(book.netOf[point] ?? 0), point: book.label(point) });
    return {
      ok: true,
      result: {
        ...plan,
        probes: probes.map(({ a, b, ...probe }) => ({ ...probe, from: end(a), to: end(b) })),
        passedOver: read.passedOver,
        report: given.results.length === 0 ? null : reportOf(netlist, probes, given.results, book),
      },
    };
  },
});

type Read =
  | { ok: true; netlist: Netlist; passedOver: { line: number; reason: string }[] }
  | { ok: false; fields: Record<string, string> };

function readNetlist({ nets, ipcD356 }: Given): Read {
  if (nets.length > 0 && ipcD356 !== "") {
    return { ok: false, fields: { ipcD356: "Give nets or the text of a file, not both." } };
  }
  if (ipcD356 === "") {
    if (nets.length === 0) return { ok: false, fields: { nets: "Give at least one net, or the text of a file." } };
    const made = netlistOf(nets);
    return made.ok ? { ...made, passedOver: [] } : made;
  }
  const { netlist, passedOver } = readIpcD356(ipcD356);
  if (netlist.nets.length === 0) return { ok: false, fields: { ipcD356: "No net could be read from this text." } };
  return { ok: true, netlist, passedOver: passedOver.slice(0, 100) };
}

function optionsOf({ populated, limits, connector, signals, rails, railsOnly }: Given): PlanOptions {
  return {
    ...{ populated, rails, railsOnly, limits: limitsOf(limits) },
    ...(connector === null ? {} : { connector }),
    ...(signals === null ? {} : { signals }),
  };
}

function limitsOf(limits: Given["limits"]): ProbeLimits {
  if (typeof limits !== "string") return { class: "own", ...limits, testVolts: null };
  const found = PROBE_LIMIT_CLASSES.find((one) => one.class === limits);
  if (!found) throw new Error(`no limits of class ${limits}`);
  return found;
}

function reportOf(
  netlist: Netlist,
  probes: ReturnType<typeof planProbes>["probes"],
  results: Given["results"],
  book: ReturnType<typeof pointBook>,
) {
  const report = findContinuityFaults(netlist, probes, results);
  const findings = report.findings.map(({ pieces, ...finding }) => ({
    ...finding,
    pieces: pieces.map((piece) => piece.map(book.label)),
  }));
  return { ...report, findings };
}
