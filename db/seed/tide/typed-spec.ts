import type { CheckLine } from "./check-line";

const UNIT_OF: Record<string, string> = {
  Voltage: "V",
  Ripple: "V",
  Noise: "V",
  Current: "A",
  Resistance: "Ω",
  Frequency: "Hz",
  Time: "s",
  "Duty factor": "%",
  Count: "",
};

/** The editor's form of an expectation, as each kind has it. */
export function typedSpec(expect: CheckLine["expect"]): unknown {
  switch (expect.kind) {
    case "statement":
    case "capture":
      return { expects: "" };
    case "photo":
      return { expects: expect.subject, minimum: "1" };
    case "reading":
      return { unit: UNIT_OF[expect.quantity] ?? "", limits: expect.limits, expected: expect.expected ?? "" };
    case "table":
      return {
        columns: expect.columns,
        rows: expect.rows.map((row) => ({
          label: row.label,
          unit: /Ω/.test(row.limits) ? "Ω" : "V",
          limits: row.limits,
          cells: expect.columns.map(() => ""),
        })),
      };
  }
}
