import type { Draft } from "../draft";
import type { Edit } from "../finding";
import type { Turned } from "../find-turned";
import type { IndexedConnector, IndexedPin } from "../index-design";
import type { End } from "../index-machine";
import type { Survey } from "../survey";
import { turnedPins, turnWords, type Turn } from "../turns";

/**
 * A connector that is listed the wrong way round: read from the solder side, from the wrong end, or from a drawing of
 * the other half. One finding for the connector instead of one for each of its pins; every other rule looks at the
 * machine as if it were mended. Which of the two lists is wrong follows from where else the card fits: when the card is
 * turned against every slot it meets, it is the card; otherwise the slot. Common practice, no source.
 */
export const mirrored = (survey: Survey, turned: readonly Turned[]): Draft[] =>
  turned.map((one): Draft => {
    const { meeting, turn, asListed, whenTurned, compared } = one;
    const culprit = culpritOf(survey, one, turned);
    const partner = culprit === meeting.from ? meeting.to : meeting.from;
    const { connector, placed } = culprit;
    const words = turnWords(connector.face, turn);
    const name = `${connector.board} ${connector.reference}`;
    return {
      rule: "mirrored",
      weight: "must",
      subject: name,
      title: (subject) => `${subject} is listed mirrored, ${words}`,
      why: `Against ${partner.placed.placement.label} ${partner.connector.reference} ${whenTurned} of ${compared} signals fit when it is turned, ${asListed} as it is listed. Everything else is checked as if it were turned.`,
      mend: `Turn the list of ${name}: ${words}.`,
      edits: turnedList(connector, turn),
      pins: connector.pins
        .filter(({ signal }) => signal !== "")
        .map((pin) => ({ ...survey.pinOfDesign(pin), label: placed.placement.label, placement: placed.placement.id })),
      facts: words,
      sameAs: `${connector.board} ${connector.id}`,
    };
  });

function culpritOf(survey: Survey, { meeting }: Turned, turned: readonly Turned[]): End {
  const { from, to } = meeting;
  const isTurned = (connector: IndexedConnector) =>
    turned.filter((one) => one.meeting.from.connector === connector || one.meeting.to.connector === connector).length;
  const alwaysTurned = ({ connector }: End) => isTurned(connector) === survey.partnersOf(connector).length;
  const isCard = ({ placed }: End) => placed.board.design.kind === "card";
  return [from, to].find((end) => isCard(end) && alwaysTurned(end)) ?? [to, from].find(alwaysTurned) ?? to;
}

/** The whole list, each pin with what stands where it would be if turned. */
function turnedList({ board, id, face, pins, byName }: IndexedConnector, turn: Turn): Edit[] {
  const swap = turnedPins(face, face, turn);
  const nameOf = new Map(face.pins.map(({ name }) => [name.toLowerCase(), name]));
  const touched = new Set(pins.flatMap(({ name }) => [name.toLowerCase(), swap.get(name.toLowerCase()) ?? ""]));
  return [...touched].flatMap((pin): Edit[] => {
    const name = nameOf.get(pin);
    const source = swap.get(pin);
    if (name === undefined || source === undefined) return [];
    return [{ kind: "pin", board, connectorId: id, pin: name, set: contents(byName.get(source)?.[0]) }];
  });
}

function contents(pin: IndexedPin | undefined): Extract<Edit, { kind: "pin" }>["set"] {
  if (!pin) return { signal: "", role: "no connection", family: "", loads: 0, enableGroup: "", pullUpOhm: null };
  const { signal, role, family, loads, enableGroup, pullUpOhm } = pin.design;
  return { signal, role, family, loads, enableGroup, pullUpOhm };
}
