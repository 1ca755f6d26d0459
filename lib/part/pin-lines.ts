import type { GatePins } from "@/lib/calc/logic-parts";

type Read<Value> = { ok: true; value: Value } | { ok: false; message: string };

/** "1, 2 5" as numbers of pins of a package with so many. Empty: none. */
export function readPins(typed: string, pins: number): Read<number[]> {
  const found: number[] = [];
  for (const word of typed.split(/[\s,;]+/).filter(Boolean)) {
    const pin = Number(word);
    if (!/^\d+$/.test(word) || pin < 1)
      return { ok: false, message: `“${word}” is no pin. Write numbers, such as 1 2 13.` };
    if (pin > pins) return { ok: false, message: `Pin ${pin} is more than the ${pins} pins of the package.` };
    if (found.includes(pin)) return { ok: false, message: `Pin ${pin} stands here twice.` };
    found.push(pin);
  }
  return { ok: true, value: found };
}

/**
 * One line a gate: its inputs, an arrow or >, its outputs: "1 2 > 3". An input that rests high when the gate is spare has
 * a ^ behind it: "1^ 2 > 5". Empty: the pins are not known.
 */
export function readGateLines(typed: string, pins: number): Read<GatePins[] | null> {
  const lines = typed.split("\n").map((text) => text.trim());
  const gates: GatePins[] = [];
  for (const [index, text] of lines.entries()) {
    if (text === "") continue;
    const say = (message: string): Read<never> => ({ ok: false, message: `Line ${index + 1}: ${message}` });
    const sides = text.replaceAll("→", ">").split(">");
    if (sides.length !== 2) return say("write the inputs, then > and the outputs: 1 2 > 3.");
    const [into = "", out = ""] = sides;
    const inputs = readPins(into.replaceAll("^", ""), pins);
    if (!inputs.ok) return say(inputs.message);
    const outputs = readPins(out, pins);
    if (!outputs.ok) return say(outputs.message);
    const high = [...into.matchAll(/(\d+)\s*\^/g)].map(([, pin]) => Number(pin));
    gates.push({ inputs: inputs.value, outputs: outputs.value, restHigh: high });
  }
  return { ok: true, value: gates.length === 0 ? null : gates };
}

export const writePins = (pins: readonly number[]): string => pins.join(" ");

export const writeGateLines = (gates: readonly GatePins[] | null): string =>
  (gates ?? [])
    .map(({ inputs, outputs, restHigh }) => {
      const into = inputs.map((pin) => (restHigh.includes(pin) ? `${pin}^` : String(pin))).join(" ");
      return `${into} > ${outputs.join(" ")}`;
    })
    .join("\n");
