import { loadedEdge, type LoadedEdge, type Loading } from "../levels";
import {
  pullUpBehaviour,
  judgePullUp,
  type PullUpBehaviour,
  type PullUpJudgement,
  type PullUpWindow,
} from "../pull-up";
import { indexMachine } from "./index-machine";
import { levelPairs, type LevelPair } from "./level-pairs";
import type { Machine, PinRole } from "./machine";
import type { Net } from "./net";
import { capacitancePf, driverLoadings, pullUpOhm } from "./net-currents";
import { netSentences } from "./net-sentences";
import { byName } from "./order";
import { netPullUpWindow, pullUpLine } from "./pull-up-line";
import { studyNet, type NetStudy, type Party } from "./study-net";
import { surveyMachine, type Survey } from "./survey";

export type NetParty = {
  placement: string;
  /** "CON-01 a10". */
  place: string;
  role: PinRole;
  family: string;
  enableGroup: string;
  loads: number;
};

/** The smallest margin of one level and the pair that binds it. */
export type WorstMargin = { volts: number; driver: NetParty; receiver: NetParty; driving: string; receiving: string };

/** What a net's own panel shows. Null where there is nothing to compute or a family is not known. */
export type NetFacts = {
  drivers: (NetParty & { loading: Loading | null })[];
  loads: NetParty[];
  high: WorstMargin | null;
  low: WorstMargin | null;
  /** The driver that is worst off. */
  fanOut: (Loading & { driver: NetParty }) | null;
  capacitancePf: number | null;
  /** Of the slowest driver that makes its own edges, with the net's capacitance. */
  edge: (LoadedEdge & { driver: NetParty }) | null;
  pullUps: { placement: string; place: string; ohm: number }[];
  /** Of all resistors together. */
  pullUp: (PullUpBehaviour & { judgement: PullUpJudgement | null }) | null;
  /** Where open-drain outputs drive the net. */
  window: PullUpWindow | null;
  /** Families of drivers and loads that the table does not have, and "" for pins that name none. */
  unknownFamilies: string[];
  sentences: string[];
  /** For a line of a table: "0.9 of 4 mA", "two drivers", "no pull-up". */
  inShort: { text: string; isWrong: boolean };
};

export const netFacts = (machine: Machine, net: Net): NetFacts => netFactsOf(machine)(net);

/** The same for many nets of one machine, which is looked through once. */
export function netFactsOf(machine: Machine): (net: Net) => NetFacts {
  const survey = surveyMachine(indexMachine(machine), []);
  return (net) => factsOf(survey, studyNet(net));
}

function factsOf(survey: Survey, study: NetStudy): NetFacts {
  const party = (one: Party) => netParty(survey, one);
  const loadings = driverLoadings(survey, study);
  const drivers = study.drivers.map((one, at) => ({ ...party(one), loading: loadings[at] ?? null }));
  const pairs = levelPairs(survey, study);
  const pf = capacitancePf(survey, study) ?? null;
  const facts = {
    drivers,
    loads: study.receivers.map(party),
    high: worst(
      survey,
      pairs.filter((pair) => !pair.highByPullUp),
      "highVolts",
    ),
    low: worst(survey, pairs, "lowVolts"),
    fanOut: mostLoaded(drivers),
    capacitancePf: pf,
    edge: slowestEdge(survey, study, pf),
    pullUps: study.pullUps.map((pin) => ({
      placement: pin.placement,
      place: survey.place(pin),
      ohm: pin.pullUpOhm ?? 0,
    })),
    pullUp: pullUpOf(survey, study),
    window: study.drivers.some(isOpen) ? (netPullUpWindow(survey, study) ?? null) : null,
    unknownFamilies: [...study.drivers, ...study.receivers]
      .map(({ family }) => family)
      .filter((family, at, all) => !survey.family(family) && all.indexOf(family) === at)
      .sort(byName),
  };
  return { ...facts, ...netSentences(facts) };
}

const isOpen = ({ role }: Party) => role === "open-drain output";

function netParty({ place }: Survey, { placement, role, family, enableGroup, loads, pins }: Party): NetParty {
  return { placement, place: pins[0] ? place(pins[0]) : "", role, family, enableGroup, loads };
}

function worst(survey: Survey, pairs: readonly LevelPair[], level: "highVolts" | "lowVolts"): WorstMargin | null {
  const [first] = [...pairs].sort((a, b) => a.margins[level] - b.margins[level]);
  if (!first) return null;
  const { driver, receiver, driving, receiving, margins } = first;
  return {
    volts: margins[level],
    driver: netParty(survey, driver),
    receiver: netParty(survey, receiver),
    driving: driving.name,
    receiving: receiving.name,
  };
}

function mostLoaded(drivers: NetFacts["drivers"]): NetFacts["fanOut"] {
  const share = ({ high, low }: Loading) => Math.max(high.usedA / high.availableA, low.usedA / low.availableA);
  const loaded = drivers.flatMap(({ loading, ...driver }) => (loading ? [{ ...loading, driver }] : []));
  return loaded.sort((a, b) => share(b) - share(a))[0] ?? null;
}

function slowestEdge(survey: Survey, { drivers }: NetStudy, pf: number | null): NetFacts["edge"] {
  if (pf === null) return null;
  const edges = drivers.flatMap((driver) => {
    const family = isOpen(driver) ? undefined : survey.family(driver.family);
    const edge = family && loadedEdge(family, pf);
    return edge?.ok ? [{ ...edge.value, driver: netParty(survey, driver) }] : [];
  });
  return edges.sort((a, b) => b.edgeS - a.edgeS)[0] ?? null;
}

function pullUpOf(survey: Survey, study: NetStudy): NetFacts["pullUp"] {
  const ohm = pullUpOhm(study);
  const line = ohm === null ? undefined : pullUpLine(survey, study);
  if (ohm === null || !line) return null;
  const behaviour = pullUpBehaviour(line, ohm);
  const judgement = study.drivers.some(isOpen) ? judgePullUp(line, ohm) : undefined;
  return behaviour.ok ? { ...behaviour.value, judgement: judgement?.ok ? judgement.value : null } : null;
}
