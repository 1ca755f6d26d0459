import { type FamilyFigures } from "../part";

/** JESD7-A, −40 … 85 °C, whole package: gates 20 µA, flip-flops 40 µA, larger functions 80 µA, bus drivers 80 µA. From memory. */
const AT_REST_A = { gates: 20e-6, flipFlops: 40e-6, larger: 80e-6 } as const;

export type CmosRow = [
  kind: keyof typeof AT_REST_A,
  cpdPf: number | null,
  cpdPer: "gate" | "package",
  tpdTypicalNs: number | null,
  tpdMaxNs: number | null,
  status: string,
];

const CMOS_CONDITIONS = "Typical delay at 5 V, 15 pF, 25 °C";

export function cmosFigures(rows: Record<string, CmosRow>): Record<string, FamilyFigures> {
  return Object.fromEntries(
    Object.entries(rows).map(([number, [kind, cpdPf, cpdPer, typical, max, status]]) => [
      number,
      {
        staticA: AT_REST_A[kind],
        cpdPf,
        cpdPer,
        tpdTypicalS: typical === null ? null : typical / 1e9,
        tpdMaxS: max === null ? null : max / 1e9,
        note: `${CMOS_CONDITIONS}. ${status}`,
      },
    ]),
  );
}
