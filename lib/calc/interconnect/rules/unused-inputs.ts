import type { Draft, Rule } from "../draft";
import { editPins } from "../edit-pins";
import { listed, verb } from "../wording";

/** Holds a lone CMOS input without loading anything; common practice, no source. */
const TIE_OHM = 10_000;

/**
 * CMOS inputs on the connector that carry nothing: they float, switch at random and draw current through both their
 * transistors. Stated in every CMOS data sheet. Bipolar inputs float high and are let be. The edit ties them by 10 kΩ.
 */
export const openInputs: Rule = (survey) =>
  survey.index.boards.flatMap(({ connectors }) =>
    connectors.flatMap((connector): Draft[] => {
      const open = connector.pins.filter(
        ({ design, signal }) =>
          design.role === "input" &&
          signal === "" &&
          design.pullUpOhm === null &&
          survey.family(design.family)?.technology === "CMOS",
      );
      if (open.length === 0) return [];
      const pins = open.map(survey.pinOfDesign);
      const name = `${connector.board} ${connector.reference}`;
      return [
        {
          rule: "open-inputs",
          weight: "should",
          subject: name,
          title: (subject) => `Unused CMOS inputs on ${subject} are not tied`,
          why: `${listed(open.map((pin) => pin.name))} ${verb(open.length, "carries", "carry")} no signal. A CMOS input that floats draws current and switches at random.`,
          mend: "Tie each to the supply by 10\u202fkΩ, or to ground.",
          edits: editPins(pins, { pullUpOhm: TIE_OHM }),
          pins,
          sameAs: `${connector.board} ${connector.id}`,
        },
      ];
    }),
  );

/** Gates that packing leaves over, their CMOS inputs tied by nobody yet; see lib/calc/packing. */
export const spareGates: Rule = (survey) =>
  survey.index.boards.flatMap(({ design }): Draft[] => {
    const spares = design.untiedSpares.filter(
      ({ family, inputs }) => inputs > 0 && survey.family(family)?.technology !== "bipolar",
    );
    if (spares.length === 0) return [];
    const told = spares.map(
      ({ part, gates, inputs }) => `${gates} of ${part} with ${inputs} input${inputs === 1 ? "" : "s"}`,
    );
    return [
      {
        rule: "spare-gates",
        weight: "should",
        subject: design.code,
        title: (subject) => `Inputs of spare gates on ${subject} are not tied`,
        why: `Spare: ${listed([...told].sort())}. A CMOS input that floats draws current and switches at random.`,
        mend: "Tie them to ground or to the supply, and note it on the drawing.",
        edits: [{ kind: "tie-spares", board: design.code }],
        pins: [],
        boards: [design.code],
        facts: [...told].sort().join(", "),
        sameAs: design.code,
      },
    ];
  });
