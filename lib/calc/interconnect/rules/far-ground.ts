import { pinsApartMm } from "../../connector";
import type { Draft, Rule } from "../draft";
import { distinct } from "../order";
import { DRIVES } from "../study-net";
import { listed, millimetres, seconds } from "../wording";
import { pinsInPlace, SLACK_MM } from "./placed-pins";

/** Edges this quick ring over a few centimetres of loop; AC, ACT, AHC, LVC, F and S are. Common practice, no source. */
const FAST_EDGE_S = 3e-9;
/** A ground within two places of the 2.54 mm grid keeps the loop small. Common practice, no source. */
const NEAR_MM = 5.08;

/**
 * Outputs with fast edges whose current finds no ground pin nearby to come back through: the loop picks up and gives off,
 * and the ground of the whole card jumps. One finding a connector. No edits: where a ground pin fits, the layout says.
 */
export const farGround: Rule = (survey) =>
  survey.index.boards.flatMap(({ connectors }) =>
    connectors.flatMap((connector): Draft[] => {
      const placed = pinsInPlace(connector);
      const grounds = placed.filter(({ pin }) => pin.design.role === "ground");
      const far = placed.flatMap(({ pin, at }) => {
        const family = DRIVES.has(pin.design.role) ? survey.family(pin.design.family) : undefined;
        if (!family || family.edgeS > FAST_EDGE_S) return [];
        const mm = Math.min(...grounds.map((ground) => pinsApartMm(connector.face, at, ground.at)));
        return mm > NEAR_MM + SLACK_MM ? [{ pin, family, mm }] : [];
      });
      const farthest = far.reduce<(typeof far)[number] | undefined>((a, b) => (a && a.mm >= b.mm ? a : b), undefined);
      // Without any ground pin groundMissing speaks.
      if (!farthest || grounds.length === 0) return [];
      const families = distinct(far.map(({ family }) => family.name));
      const distances = distinct(far.map(({ pin, mm }) => `${pin.name} ${millimetres(mm)}`));
      return [
        {
          rule: "far-ground",
          weight: "should",
          subject: `${connector.board} ${connector.reference}`,
          title: (subject) => `Fast edges without a ground pin nearby on ${subject}`,
          why: `${listed(families)} edges of about ${seconds(farthest.family.edgeS)} on ${listed(far.map(({ pin }) => pin.name))}; from ${farthest.pin.name} the nearest ground is ${millimetres(farthest.mm)} away.`,
          mend: `Put a ground pin within ${millimetres(NEAR_MM)} of each.`,
          edits: [],
          pins: far.map(({ pin }) => survey.pinOfDesign(pin)),
          facts: [...families, ...distances].join(", "),
          sameAs: `${connector.board} ${connector.id}`,
        },
      ];
    }),
  );
