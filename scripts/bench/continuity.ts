import { planProbes, PROBE_LIMIT_CLASSES } from "@/lib/calc/continuity";
import { readIpcD356 } from "@/lib/calc/netlist";
import { largeNetlist, type Pitch } from "./large-netlist";
import { summarise } from "./measure";
import { milliseconds, times, type Row } from "./row";

const POINTS = 100_000;
const MOST = 3;
const WARM_UP = 3;
const ROUNDS = 11;

/** Planning the probes of a board with 100,000 points against reading its netlist, in turns: wide and narrow pitch. */
export const benchContinuity = (): Row[] => (["2.54 mm", "0.635 mm"] as const).map(comparePlanning);

function comparePlanning(pitch: Pitch): Row {
  const text = largeNetlist(POINTS, pitch);
  const [limits] = PROBE_LIMIT_CLASSES;
  if (!limits) throw new Error("There are no limits to plan by.");
  const [reading, planning]: [number[], number[]] = [[], []];
  for (let round = -WARM_UP; round < ROUNDS; round += 1) {
    const begin = performance.now();
    const { netlist } = readIpcD356(text);
    const read = performance.now();
    planProbes(netlist, { populated: false, limits });
    const planned = performance.now();
    if (round < 0) continue;
    reading.push(read - begin);
    planning.push(planned - read);
  }
  const [floor, ours] = [summarise(reading).median, summarise(planning).median];
  return {
    work: `continuity plan, ${POINTS.toLocaleString("en-GB")} points at ${pitch}, against reading their netlist`,
    ours: milliseconds(ours),
    floor: milliseconds(floor),
    ratio: times(ours / floor),
    toReach: `${MOST} ×`,
    reached: ours / floor <= MOST,
  };
}
