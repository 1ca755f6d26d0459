import { CONTACT_OHM, judgeContacts } from "../../contact";
import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import type { Edit } from "../finding";
import type { Survey } from "../survey";
import { amps, listed, pinCount } from "../wording";
import { offeredPins } from "./offered-pins";
import { isOfPath, matedConnectors, supplyPaths, supplyPins, type SupplyPath } from "./supply-paths";

/**
 * Current per supply and ground contact against the rating, derated to the air at the connectors; source: see
 * lib/calc/contact. The worst draw of a board over its pins of that rail on connectors that are put together, taken to
 * share alike; a board that feeds a rail draws less than nothing. The worst placement of a design speaks.
 */
export const contactCurrent: Rule = (survey) => {
  const { index } = survey;
  const { ambientC } = index.machine.conditions;
  const found = supplyPaths(survey).flatMap((path) => {
    const pins = supplyPins(survey, path);
    const currentA = Math.abs(path.worstA);
    const answer = judgeContacts({ currentA, contacts: pins.length, contactOhm: CONTACT_OHM }, ambientC);
    if (!answer.ok || answer.value.holds) return [];
    return [{ path, pins, currentA, judged: answer.value }];
  });
  return found.map(({ path, pins, currentA, judged }): Draft => {
    const { placed, rail, role } = path;
    const board = placed.board.design.code;
    const what = role === "ground" ? "ground" : rail;
    const edits = furtherPins(survey, path, judged.contactsNeeded - pins.length);
    return {
      rule: "contact-current",
      weight: "must",
      subject: `${board}: ${what}`,
      title: (subject) => `${subject} pins carry too much current`,
      why: `${amps(currentA)} through ${pinCount(pins.length)}; one bears ${amps(judged.limitA)} at ${ambientC}\u202f°C.`,
      mend:
        edits.length > 0
          ? `Take ${what} on ${listed(edits.flatMap((edit) => (edit.kind === "pin" ? edit.pin : [])))} too, where the other half has it.`
          : `Give ${what} ${pinCount(judged.contactsNeeded - pins.length)} more.`,
      edits,
      pins: pins.map(survey.pinOfDesign),
      boards: [board],
      facts: judged.sentence,
      sameAs: `${board} ${what}`,
    };
  });
};

/** Edits that add as many contacts as are missing; none when the other half does not offer that many. */
function furtherPins(survey: Survey, path: SupplyPath, missing: number): Edit[] {
  const edits = matedConnectors(survey, path.placed).flatMap((connector) =>
    offeredPins(survey, connector, (pin) => isOfPath(survey, path, pin)).flatMap(({ pin, signal }) =>
      editPins([{ board: connector.board, connectorId: connector.id, pin }], { signal, role: path.role }),
    ),
  );
  return missing > 0 && edits.length >= missing ? edits.slice(0, missing) : [];
}

/** A board that draws from a rail of which it has no pin: its parts stay without supply. No edits: which pin, the builder knows. */
export const railMissing: Rule = (survey) =>
  supplyPaths(survey)
    .filter((path) => matedConnectors(survey, path.placed).some(({ pins }) => pins.length > 0))
    .filter((path) => path.role === "power" && path.worstA !== 0 && supplyPins(survey, path).length === 0)
    .map(({ placed, rail }): Draft => {
      const board = placed.board.design.code;
      return {
        rule: "rail-missing",
        weight: "must",
        subject: `${board}: ${rail}`,
        title: () => `${board} draws from ${rail} and has no pin for it`,
        why: `The budget counts on ${rail}; none of its connectors brings it.`,
        mend: `Give ${board} a pin for ${rail}, or correct its budget.`,
        edits: [],
        pins: [],
        boards: [board],
        sameAs: `${board} ${rail}`,
      };
    });
