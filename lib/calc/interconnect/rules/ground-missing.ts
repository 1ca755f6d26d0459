import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import { listed } from "../wording";
import { offeredPins, partnersWithPins } from "./offered-pins";

/**
 * A connector that is put together without a ground pin: the current of all its signals comes back through some other
 * connector, or through the inputs. Worse where the board has no ground on any connector. The edit takes the pins where
 * the other half has ground and this one has nothing.
 */
export const groundMissing: Rule = (survey) =>
  survey.index.boards.flatMap((board) => {
    if (board.design.kind !== "card") return [];
    const mated = board.connectors.filter(
      (connector) =>
        connector.pins.some(({ signal }) => signal !== "") && partnersWithPins(survey, connector).length > 0,
    );
    const without = mated.filter((connector) => !connector.pins.some(({ design }) => design.role === "ground"));
    return without.map((connector): Draft => {
      const offered = offeredPins(survey, connector, (pin) => pin.design.role === "ground");
      const name = `${connector.board} ${connector.reference}`;
      const edits = offered.flatMap(({ pin, signal }) =>
        editPins([{ board: connector.board, connectorId: connector.id, pin }], { signal, role: "ground" }),
      );
      return {
        rule: "ground-missing",
        weight: without.length === mated.length ? "must" : "should",
        subject: name,
        title: (subject) => `${subject} has no ground pin`,
        why: "The current of its signals has no way back through this connector.",
        mend:
          edits.length > 0
            ? `Take ground on ${listed(offered.map(({ pin }) => pin))}, where the other half has it.`
            : "Give it a ground pin, better one for every eight signals.",
        edits,
        pins: connector.pins
          .filter(({ signal }) => signal !== "")
          .slice(0, 1)
          .map(survey.pinOfDesign),
        sameAs: `${connector.board} ${connector.id}`,
      };
    });
  });
