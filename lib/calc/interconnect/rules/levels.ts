import { inputStress, margins } from "../../levels";
import type { Draft, Rule } from "../draft";
import { isStressed, levelPairs, type LevelPair } from "../level-pairs";
import { byName, distinct } from "../order";
import { pinsOf, type NetStudy, type Party } from "../study-net";
import type { Survey } from "../survey";
import { listed, netName } from "../wording";
import { ttlTwin } from "./ttl-twin";

/**
 * Driver and receiver whose levels do not fit, at the machine's logic supply and worst case over temperature; see
 * lib/calc/levels for figures and sources. One finding for high and one for low; the pair that is worst speaks.
 */
export const levelsDoNotFit: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    if (study.drivers.length === 0 || study.receivers.length === 0) return [];
    const pairs = levelPairs(survey, study);
    const high = pairs.filter(({ margins, highByPullUp }) => margins.highVolts < 0 && !highByPullUp);
    const low = pairs.filter(({ margins }) => margins.lowVolts < 0);
    const stressed = pairs.filter((pair) => isStressed(survey, pair));
    return [
      ...told(survey, study, high, "high", ({ margins }) => margins.highVolts),
      ...told(survey, study, low, "low", ({ margins }) => margins.lowVolts),
      ...(stressed.length > 0 ? [overVoltage(survey, study, stressed)] : []),
    ];
  });

const TITLES = { high: "high level too low", low: "low level too high" } as const;

function told(
  survey: Survey,
  study: NetStudy,
  failing: readonly LevelPair[],
  level: "high" | "low",
  marginOf: (pair: LevelPair) => number,
): Draft[] {
  const [worst] = [...failing].sort((a, b) => marginOf(a) - marginOf(b) || byName(a.driving.name, b.driving.name));
  if (!worst) return [];
  const { driving, receiving } = worst;
  // Margins of the worst pair with the other level made to fit, so that its sentence speaks of this level only.
  const { sentence } = margins(
    level === "high" ? { ...driving, volMax: -Infinity } : { ...driving, vohMin: Infinity },
    receiving,
  );
  const twin = ttlTwin(survey, study, failing, level);
  const needsPullUp = level === "high" && driving.technology === "bipolar";
  return [
    {
      rule: `levels-${level}`,
      weight: "must",
      subject: netName(study.net),
      title: (subject) => `${subject}: ${TITLES[level]}`,
      why: `${sentence} ${placesOf(survey, worst)}.`,
      mend: mendWords(twin?.families, needsPullUp),
      edits: twin?.edits ?? [],
      pins: pairPins(study, failing),
      facts: distinct(failing.map(({ margins }) => margins.sentence)).join("; "),
      bus: distinct(failing.map((pair) => `${pair.driving.name} ${pair.receiving.name}`)).join(","),
    },
  ];
}

function overVoltage(survey: Survey, study: NetStudy, stressed: readonly LevelPair[]): Draft {
  const [first] = stressed;
  const sentence = first ? inputStress(first.driving, first.receiving).sentence : "";
  return {
    rule: "over-voltage",
    weight: "must",
    subject: netName(study.net),
    title: (subject) => `${subject}: more volts than the input bears`,
    why: `${sentence} ${first ? placesOf(survey, first) : ""}.`,
    mend: "Take a receiver whose inputs bear more than its supply, or a level shifter between them.",
    // Another family or a further part: which, depends on the board.
    edits: [],
    pins: pairPins(study, stressed),
    facts: sentence,
    bus: distinct(stressed.map((pair) => `${pair.driving.name} ${pair.receiving.name}`)).join(","),
  };
}

function mendWords(twin: string | undefined, needsPullUp: boolean): string {
  if (twin !== undefined) return `Use ${twin} on the input${needsPullUp ? ", or a pull-up" : ""}.`;
  return needsPullUp
    ? "Put a receiver with TTL thresholds there, or a pull-up."
    : "Put a buffer between them whose levels fit both.";
}

const placesOf = ({ place }: Survey, { driver, receiver }: LevelPair): string =>
  `${listed(driver.pins.slice(0, 1).map(place))} drives ${listed(receiver.pins.slice(0, 1).map(place))}`;

/** Pins of every driver and receiver whose families are among the pairs. */
function pairPins(study: NetStudy, pairs: readonly LevelPair[]) {
  const drivers = new Set(pairs.map(({ driver }) => driver.family));
  const receivers = new Set(pairs.map(({ receiver }) => receiver.family));
  const inPairs = (parties: readonly Party[], families: ReadonlySet<string>) =>
    parties.filter(({ family }) => families.has(family));
  return pinsOf([...inPairs(study.drivers, drivers), ...inPairs(study.receivers, receivers)]);
}
