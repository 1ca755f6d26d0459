import { judgePullUp, type PullUpWindow } from "../../pull-up";
import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import type { Edit } from "../finding";
import type { NetPin } from "../net";
import { pullUpOhm } from "../net-currents";
import { netPullUpWindow, pullUpLine } from "../pull-up-line";
import { pinsOf, type NetStudy } from "../study-net";
import type { Survey } from "../survey";
import { capital, counted, listed, netName, ohms } from "../wording";

/** A net that open-drain outputs pull low and nothing else drives. */
const isOpenDrain = ({ drivers }: NetStudy) =>
  drivers.length > 0 && drivers.every(({ role }) => role === "open-drain output");

/**
 * An open-drain net without a resistor never becomes high. Source: see lib/calc/pull-up. Weighs less where the net goes
 * on beyond a connector that meets nothing known: the resistor may stand there.
 */
export const noPullUp: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    if (!isOpenDrain(study) || study.pullUps.length > 0) return [];
    const { net, drivers, mayBeHeardOutside } = study;
    const window = netPullUpWindow(survey, study);
    const count = capital(counted(drivers.length));
    return [
      {
        rule: "no-pull-up",
        weight: mayBeHeardOutside ? "should" : "must",
        subject: netName(net),
        title: (subject) => `${subject} has no pull-up`,
        why: `${count} open-drain output${drivers.length === 1 ? "" : "s"} can pull it low, and nothing makes it high.${window ? ` ${window.sentence}` : ""}`,
        mend: mendOf(study, window),
        edits: placePullUp(survey, study, window),
        pins: pinsOf(drivers),
        facts: window?.sentence ?? "",
      },
    ];
  });

/** Several resistors are one of less ohms; most often two boards each thought of it. A look while the value still fits. */
export const severalPullUps: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    const { net, pullUps } = study;
    const ohm = pullUpOhm(study);
    if (!isOpenDrain(study) || pullUps.length < 2 || ohm === null) return [];
    const fits = judged(survey, study, ohm)?.verdict === "fits";
    const window = netPullUpWindow(survey, study);
    const each = pullUps.map((pin) => `${survey.place(pin)} with ${ohms(pin.pullUpOhm ?? 0)}`);
    return [
      {
        rule: "several-pull-ups",
        weight: fits ? "look" : "should",
        subject: netName(net),
        title: (subject) => `${subject} has ${counted(pullUps.length)} pull-ups`,
        why: `${listed(each)}: together ${ohms(ohm)}.`,
        mend: mendOf(study, window),
        edits: placePullUp(survey, study, window),
        pins: pullUps,
      },
    ];
  });

/** A resistance outside [Rmin, Rmax]: the outputs cannot pull low, or the line does not reach its level. */
export const pullUpOutside: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    const ohm = pullUpOhm(study);
    if (!isOpenDrain(study) || ohm === null) return [];
    const judgement = judged(survey, study, ohm);
    if (!judgement || judgement.verdict === "fits") return [];
    const window = netPullUpWindow(survey, study);
    return [
      {
        rule: "pull-up-outside",
        weight: "must",
        subject: netName(study.net),
        title: (subject) => `${subject}: pull-up ${judgement.verdict}`,
        why: judgement.sentence,
        mend:
          window?.verdict === "fits"
            ? window.sentence
            : `${window?.sentence ?? ""} Divide the net, or take other parts.`.trim(),
        edits: placePullUp(survey, study, window),
        pins: study.pullUps,
        facts: judgement.sentence,
      },
    ];
  });

function judged(survey: Survey, study: NetStudy, ohm: number) {
  const line = pullUpLine(survey, study);
  const judgement = line && judgePullUp(line, ohm);
  return judgement?.ok ? judgement.value : undefined;
}

function mendOf({ pullUps }: NetStudy, window: PullUpWindow | undefined): string {
  const where = pullUps.length > 0 ? "Keep one resistor" : "Give it one resistor";
  if (!window) return `${where}, where only one board carries it: the backplane, or the receiver.`;
  if (window.verdict === "none") return `${window.sentence} Divide the net, or take other parts.`;
  return `${where}, ${ohms(window.recommended.ohm)}, on the backplane or on a board that is there once.`;
}

/**
 * One resistor of the recommended value on a board that is on the net once: where one already is, on the backplane, or
 * on the first such card. Every other resistor goes. No edits when no value fits, or when every board on the net is
 * there several times: then each copy would bring its own.
 */
function placePullUp({ placementsOf, index }: Survey, study: NetStudy, window: PullUpWindow | undefined): Edit[] {
  if (window?.verdict !== "fits") return [];
  const isThereOnce = ({ board }: NetPin) => {
    const design = index.byCode.get(board);
    return design !== undefined && placementsOf(design).length === 1;
  };
  const rank = (pin: NetPin) =>
    (pin.pullUpOhm !== null ? 0 : 4) + (pin.kind === "backplane" ? 0 : 2) + (pin.role === "no connection" ? 1 : 0);
  const [home] = study.net.pins.filter(isThereOnce).sort((a, b) => rank(a) - rank(b));
  if (!home) return [];
  const others = study.pullUps.filter((pin) => pin !== home);
  return [...editPins(others, { pullUpOhm: null }), ...editPins([home], { pullUpOhm: window.recommended.ohm })];
}
