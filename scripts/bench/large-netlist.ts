/** Ten pins in two rows, 2.54 mm along and 7.62 mm across, in steps of 0.0001 inch; packages stand 15.24 mm apart. */
const PINS = 10;
const STEP = 1000;
const ACROSS = 3000;
const PACKAGE = { wide: 6000, high: 7000 };
const PACKAGES_A_ROW = 100;

/** So many pads on packages in a grid, as an IPC-D-356A file: rails, wires to packages nearby, and single pads. */
export function largeNetlist(pads: number): string {
  const lines = ["C  a large board", "P  UNITS CUST 0", "P  VER IPC-D-356A"];
  for (let pad = 0; pad < pads; pad += 1) {
    const [chip, pin] = [Math.floor(pad / PINS), pad % PINS];
    const [column, row] = [chip % PACKAGES_A_ROW, Math.floor(chip / PACKAGES_A_ROW)];
    const onLeft = pin < PINS / 2;
    const x = column * PACKAGE.wide + (onLeft ? 0 : ACROSS);
    const y = row * PACKAGE.high + (onLeft ? pin : PINS - 1 - pin) * STEP;
    lines.push(record(netOf(chip, pin), `U${chip + 1}`, pin + 1, x, y));
  }
  return [...lines, "999", ""].join("\r\n");
}

/** Pin 5 is ground, pin 10 the supply; the others go in bundles of four packages, from one pin to the next. */
function netOf(chip: number, pin: number): string {
  if (pin === PINS / 2 - 1) return "GND";
  if (pin === PINS - 1) return "+5V";
  return `N${Math.floor(chip / 4)}_${(pin + (chip % 4)) % PINS}`;
}

function record(net: string, part: string, pin: number, x: number, y: number): string {
  const name = `317${net.padEnd(14)}   ${part.padEnd(6)}-${String(pin).padEnd(4)} D0320PA00`;
  return `${name}X${coordinate(x)}Y${coordinate(y)}X0630Y0630R000 S0`;
}

const coordinate = (value: number) => `+${String(value).padStart(6, "0")}`;
