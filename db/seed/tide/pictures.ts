import {
  backplanePicture,
  boardPicture,
  generator,
  jpeg,
  panelPicture,
  png,
  scopePicture,
  solderSidePicture,
} from "./drawings";

const square =
  (cycles: number, shift = 0) =>
  (t: number) =>
    (t * cycles + shift) % 1 < 0.5 ? 0.8 : -0.8;

/** An edge that overshoots and rings out, as a clock line does at the far slot. */
const ringing = (cycles: number) => (t: number) => {
  const phase = (t * cycles) % 1;
  const high = phase < 0.5;
  const since = (high ? phase : phase - 0.5) * 40;
  const ring = 0.28 * Math.exp(-since / 2.2) * Math.cos(since * 4.2);
  return high ? 0.7 + ring : -0.7 - ring;
};

const ripple = (t: number) => 0.5 * Math.abs(Math.sin(t * Math.PI * 10)) - 0.25 + 0.08 * Math.sin(t * 900);

const DRAWINGS: Record<string, () => Promise<Buffer>> = {
  backplane: () => jpeg(backplanePicture()),
  panel: () => jpeg(panelPicture()),
  "scope-clock": () => png(scopePicture([ringing(3)], "1 V/div   100 ns/div   PHI1, slot 8")),
  "scope-carry": () =>
    png(
      scopePicture(
        [square(4), (t) => (square(4, 0.52)(t) > 0 && t > 0.46 && t < 0.6 ? -0.8 : 0.8)],
        "2 V/div   5 ms/div   PH7, CARRY_N",
      ),
    ),
  "scope-phases": () =>
    png(
      scopePicture([square(5), (t) => ((t * 5 + 0.48) % 1 < 0.42 ? 0.8 : -0.8)], "2 V/div   200 ns/div   PHI1, PHI2"),
    ),
  "scope-ripple": () => png(scopePicture([ripple], "10 mV/div   5 ms/div   +5 V, AC")),
};

/** Width of an ordinary phone photo is not needed here: 1600 pixels show everything there is. */
export function drawPicture(name: string): Promise<Buffer> {
  const drawn = DRAWINGS[name];
  if (drawn) return drawn();
  const [side, code = "CON"] = name.split("-");
  if (side === "solder") return jpeg(solderSidePicture(code, code === "CON" ? 3 : 0));
  return jpeg(boardPicture(code, { SUP: 4, PAN: 2, OUT: 6, SUM: 12 }[code] ?? 9, code === "CON" ? 2 : 0));
}

/** Ripple on the 5 V rail as a scope would save it: a preamble, a header with units, 5,000 samples. */
export function rippleText(): string {
  const next = generator("ripple");
  const lines = Array.from({ length: 5000 }, (_, i) => {
    const t = i * 4e-6;
    const v = 0.0065 * Math.abs(Math.sin(t * 2 * Math.PI * 50)) - 0.003 + (next() - 0.5) * 0.0022;
    return `${t.toExponential(4)},${v.toFixed(5)}`;
  });
  return ["Record,5000 points", "Sample interval,4e-6,s", "Coupling,AC,20 MHz limit", "Time,TP2", "s,V", ...lines].join(
    "\r\n",
  );
}
