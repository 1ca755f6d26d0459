/** Packages of ten pins in two rows, in steps of 0.0001 inch; wide and high: from one package to the next. */
const PACKAGES = {
  "2.54 mm": { code: "317", step: 1000, across: 3000, wide: 6000, high: 7000, pad: "D0320PA00", size: "X0630Y0630" },
  "0.635 mm": { code: "327", step: 250, across: 900, wide: 1500, high: 1500, pad: "      A01", size: "X0160Y0100" },
} as const;
const PINS = 10;
const PACKAGES_A_ROW = 100;

export type Pitch = keyof typeof PACKAGES;

/** So many pads on packages in a grid, as an IPC-D-356A file: rails, and wires between packages that stand together. */
export function largeNetlist(pads: number, pitch: Pitch): string {
  const { code, step, across, wide, high, pad, size } = PACKAGES[pitch];
  const lines = ["C  a large board", "P  UNITS CUST 0", "P  VER IPC-D-356A"];
  for (let at = 0; at < pads; at += 1) {
    const [chip, pin] = [Math.floor(at / PINS), at % PINS];
    const onLeft = pin < PINS / 2;
    const x = (chip % PACKAGES_A_ROW) * wide + (onLeft ? 0 : across);
    const y = Math.floor(chip / PACKAGES_A_ROW) * high + (onLeft ? pin : PINS - 1 - pin) * step;
    const name = `${code}${netOf(chip, pin).padEnd(14)}   ${`U${chip + 1}`.padEnd(6)}-${String(pin + 1).padEnd(4)} `;
    lines.push(`${name}${pad}X${coordinate(x)}Y${coordinate(y)}${size}R000 S0`);
  }
  return [...lines, "999", ""].join("\r\n");
}

/** Pin 5 is ground, pin 10 the supply; the others go in bundles of four packages, from one pin to the next. */
function netOf(chip: number, pin: number): string {
  if (pin === PINS / 2 - 1) return "GND";
  if (pin === PINS - 1) return "+5V";
  return `N${Math.floor(chip / 4)}_${(pin + (chip % 4)) % PINS}`;
}

const coordinate = (value: number) => `+${String(value).padStart(6, "0")}`;
