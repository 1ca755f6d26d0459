import { CARD_MAPS } from "./pin-map";

type Point = { net: string; part: string; pin: string; x: number; y: number; hole: number };

/** Chips of the constituent card: two rows of six, sixteen pins each, on a Eurocard of 160 by 100 mm. */
const CHIPS = Array.from({ length: 12 }, (_, at) => ({
  part: `U${at + 1}`,
  x: 34 + (at % 6) * 20.32,
  y: at < 6 ? 66 : 26,
}));
const SUPPLY: Record<string, string> = { "8": "GND", "16": "+5V" };
/** Nets between the chips, besides those of the connector. */
const INNER = 40;

/** The test file of the constituent card as its board house would get it. */
export function constituentNetlist(): string {
  const free = CHIPS.flatMap((chip) =>
    Array.from({ length: 16 }, (_, at) => ({ ...chip, pin: String(at + 1) })).filter(({ pin }) => !SUPPLY[pin]),
  );
  const signals = [...new Set((CARD_MAPS.CON?.J1 ?? []).map(({ signal }) => signal))];
  const inner = Array.from({ length: INNER }, (_, at) => `ACC${at}`);
  const wanted = [...signals.filter((signal) => !isSupply(signal)), ...inner, ...inner];
  const points: Point[] = [
    ...(CARD_MAPS.CON?.J1 ?? []).map(({ pin, signal }) => ({ net: signal, part: "J1", pin, ...onConnector(pin) })),
    ...CHIPS.flatMap((chip) =>
      Object.entries(SUPPLY).map(([pin, net]) => ({ net, part: chip.part, pin, ...onChip(chip, pin) })),
    ),
    ...wanted.flatMap((net, at) => {
      // Steps of five reach every pin once and spread the pins of a net over several chips.
      const spot = free[(at * 5) % free.length];
      return spot ? [{ net, part: spot.part, pin: spot.pin, ...onChip(spot, spot.pin) }] : [];
    }),
  ];
  return [
    "C  Constituent card, revision A",
    "P  JOB   CON-A",
    "P  UNITS CUST 0",
    "P  TITLE Phase accumulator of one constituent",
    ...points.map(record),
    // An axis that is left away stays as it was: the line keeps to its 80 columns.
    `389BOARD_EDGE      X000000Y000000 X${units(160)} Y${units(100)} X000000 Y000000`,
    "999",
    "",
  ].join("\r\n");
}

const isSupply = (signal: string) => signal === "GND" || signal === "+5V";

function onConnector(pin: string) {
  const [row, position] = [pin.charAt(0), Number(pin.slice(1))];
  return { x: row === "a" ? 6 : 8.54, y: 10.6 + (32 - position) * 2.54, hole: 1 };
}

function onChip({ x, y }: { x: number; y: number }, pin: string) {
  const number = Number(pin);
  const isLeft = number <= 8;
  return { x: isLeft ? x : x + 7.62, y: y - (isLeft ? number - 1 : 16 - number) * 2.54, hole: 0.8 };
}

/** Columns of a 317 record: net 4–17, part 21–26, pin 28–31, hole 33–38, access 39–41, place 42–57, pad 58–67. */
function record({ net, part, pin, x, y, hole }: Point): string {
  const name = `317${net.padEnd(14)}   ${part.padEnd(6)}-${pin.padEnd(4)} D${units(hole).slice(2)}PA00`;
  return `${name}X+${units(x)}Y+${units(y)}X0630Y0630`;
}

/** Ten-thousandths of an inch in six digits. */
const units = (mm: number) => String(Math.round((mm / 25.4) * 10_000)).padStart(6, "0");
