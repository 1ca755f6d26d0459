import { PIN_ROLES, type PinRole } from "@/lib/calc/interconnect";

/** Short forms that people write into such tables. */
const SHORT: Record<string, PinRole> = {
  pwr: "power",
  supply: "power",
  vcc: "power",
  vdd: "power",
  gnd: "ground",
  pp: "push-pull output",
  totem: "push-pull output",
  out: "push-pull output",
  output: "push-pull output",
  o: "push-pull output",
  ts: "three-state output",
  "3s": "three-state output",
  tri: "three-state output",
  tristate: "three-state output",
  "3state": "three-state output",
  z: "three-state output",
  od: "open-drain output",
  oc: "open-drain output",
  opencollector: "open-drain output",
  opencollectoroutput: "open-drain output",
  in: "input",
  i: "input",
  bi: "bidirectional",
  bidir: "bidirectional",
  io: "bidirectional",
  inout: "bidirectional",
  pas: "passive",
  copper: "passive",
  nc: "no connection",
  noconnect: "no connection",
  none: "no connection",
};

const plain = (text: string) => text.toLowerCase().replace(/[\s_/.-]+/g, "");
const FULL = PIN_ROLES.map((role) => [plain(role), role] as const);

/**
 * The role that the text means: the word itself in any case, a short form (pp, oc, gnd, i/o), or the beginning of one
 * word only. Undefined when it means none or could mean two.
 */
export function readRole(text: string): PinRole | undefined {
  const typed = plain(text);
  if (typed === "") return undefined;
  const short = Object.hasOwn(SHORT, typed) ? SHORT[typed] : undefined;
  const begun = FULL.filter(([word]) => word.startsWith(typed)).map(([, role]) => role);
  return FULL.find(([word]) => word === typed)?.[1] ?? short ?? (begun.length === 1 ? begun[0] : undefined);
}

const GROUND = /^(?:[adps]?gnd|0v|vss|earth|chassis)(?:[\d_.-].*)?$/i;
const SUPPLY = /^(?:[+\-−]\d+(?:[.v]\d*)?v?\d*|v(?:cc|dd|ee|bb))(?:[_.-].*)?$/i;

/** What a pin is whose role was left empty: a rail's name says power or ground, any other signal is copper only. */
export function impliedRole(signal: string, rails: readonly string[] = []): PinRole {
  if (GROUND.test(signal)) return "ground";
  return rails.includes(signal) || SUPPLY.test(signal) ? "power" : "passive";
}
