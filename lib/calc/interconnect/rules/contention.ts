import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import { grouped } from "../grouped";
import { pinsOf, type NetStudy, type Party } from "../study-net";
import type { Survey } from "../survey";
import { capital, counted, listed, netName, verb } from "../wording";
import { chooseGroup, groupWords } from "./enable-group";

/**
 * Two push-pull outputs on one net: when one is high and the other low, both carry the current of a short circuit, tens
 * of milliamperes, and the level between them means nothing. Practice of the trade; the outputs' short-circuit currents
 * stand in their sheets.
 */
export const twoPushPull: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    const pushing = withRole(study, "push-pull output");
    if (pushing.length < 2) return [];
    const choice = chooseGroup(survey, study);
    return [
      {
        rule: "two-push-pull",
        weight: "must",
        subject: netName(study.net),
        title: (subject) => `${capital(counted(pushing.length))} push-pull outputs drive ${subject}`,
        why: `${places(survey, pushing)}. When one is high and another low, both carry a short-circuit current.`,
        mend: `Make them three-state, ${groupWords(choice)}.`,
        edits: editPins(pinsOf(pushing), { role: "three-state output", enableGroup: choice.group }),
        pins: pinsOf(pushing),
        bus: "",
      },
    ];
  });

/**
 * Outputs of different kinds on one net. A push-pull output never lets go, so whatever else drives the net drives
 * against it; an open-drain output that pulls low shorts a three-state output that is on and high.
 * Left out: nets with several push-pull outputs, see twoPushPull. No edits where open-drain and three-state outputs
 * meet: whether the net is a wired AND or a bus, only its builder knows.
 */
export const mixedOutputs: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    const pushing = withRole(study, "push-pull output");
    const turns = [...withRole(study, "three-state output"), ...withRole(study, "bidirectional")];
    const open = withRole(study, "open-drain output");
    if (pushing.length > 1) return [];
    const kinds = [pushing, turns, open].filter((parties) => parties.length > 0);
    if (kinds.length < 2) return [];
    const onlyBidirectional = open.length === 0 && withRole(study, "three-state output").length === 0;
    const others = [...turns, ...open];
    const pins = pinsOf([...pushing, ...others]);
    const subject = netName(study.net);
    const common = { rule: "mixed-outputs", subject, pins, bus: kindWords(others) } as const;
    if (pushing.length === 0) {
      return [
        {
          ...common,
          weight: "must",
          title: (name) => `Open-drain and three-state outputs share ${name}`,
          why: `${places(survey, open)} can pull low while ${places(survey, turns)} ${verb(turns.length, "drives", "drive")} high.`,
          mend: "Make all of them open-drain with a pull-up, or all three-state in one group.",
          edits: [],
        },
      ];
    }
    const wired = turns.length === 0;
    const choice = chooseGroup(survey, study);
    return [
      {
        ...common,
        weight: onlyBidirectional ? "should" : "must",
        title: (name) => `A push-pull output shares ${name} with ${kindWords(others)}`,
        why: `${places(survey, pushing)} always drives; ${places(survey, others)} ${verb(others.length, "drives against it whenever it is on", "drive against it whenever they are on")}.`,
        mend: wired
          ? "Make it open-drain like the others."
          : `Make it three-state, ${groupWords(choice).replace("their", "its")}.`,
        edits:
          open.length > 0 && !wired
            ? []
            : editPins(
                pinsOf(pushing),
                wired
                  ? { role: "open-drain output", enableGroup: "" }
                  : { role: "three-state output", enableGroup: choice.group },
              ),
      },
    ];
  });

/**
 * Outputs that take turns must be sure never to be on at once: one group, whose decoder turns on one at a time. What is
 * in no group or in different ones may overlap. Weighs less where all are bidirectional and none has a group yet: their
 * direction is often one protocol's.
 */
export const enableGroups: Rule = (survey) =>
  survey.signalNets.flatMap((study): Draft[] => {
    const turns = study.drivers.filter(({ role }) => role === "three-state output" || role === "bidirectional");
    const groups = grouped(turns, ({ enableGroup }) => enableGroup);
    if (turns.length < 2 || (groups.size === 1 && !groups.has(""))) return [];
    const isProtocol = groups.size === 1 && turns.every(({ role }) => role === "bidirectional");
    const choice = chooseGroup(survey, study);
    const told = [...groups].map(([group, parties]) => {
      const members = places(survey, parties);
      return group === "" ? `${members} in no group` : `${members} in ${group}`;
    });
    return [
      {
        rule: "enable-groups",
        weight: isProtocol ? "look" : "should",
        subject: netName(study.net),
        title: (subject) => `Outputs that take turns on ${subject} are not in one group`,
        why: `${listed(told, 3)}. Nothing says that only one of them is on at a time.`,
        mend: `Put them ${choice.from === "the net" ? `into the group ${choice.group}` : groupWords(choice)}, if one decoder selects them all.`,
        edits: editPins(pinsOf(turns), { enableGroup: choice.group }),
        pins: pinsOf(turns),
        bus: [...groups.keys()].sort().join(","),
      },
    ];
  });

const withRole = ({ drivers }: NetStudy, role: Party["role"]) => drivers.filter((party) => party.role === role);

const places = ({ place }: Survey, parties: readonly Party[]): string =>
  listed(parties.flatMap(({ pins }) => pins.slice(0, 1).map(place)));

function kindWords(parties: readonly Party[]): string {
  const words = [...new Set(parties.map(({ role }) => role))].map((role) =>
    role === "bidirectional" ? "bidirectional pins" : `${role}s`,
  );
  return listed(words.sort());
}
