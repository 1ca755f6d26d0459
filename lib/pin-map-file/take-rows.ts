import { PIN_COLUMNS, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { TakePlan } from "./plan-take";

type TakenRow = { pin: string } & Partial<PinTexts>;
type Taken = { connectorId: string; version: number; pins: TakenRow[] };

/** What is sent of a plan: the rows that change, without their empty cells, onto the versions that were looked at. */
export function takeRows({ targets }: TakePlan): Taken[] {
  return targets.flatMap(({ target, changes }) =>
    changes.length === 0
      ? []
      : [
          {
            connectorId: target.id,
            version: target.version,
            pins: changes.map(({ pin, after }): TakenRow => ({ pin, ...withoutEmpty(after) })),
          },
        ],
  );
}

const withoutEmpty = (texts: PinTexts): Partial<PinTexts> =>
  PIN_COLUMNS.reduce(
    (all, column): Partial<PinTexts> => (texts[column] === "" ? all : { ...all, [column]: texts[column] }),
    {},
  );
