import { cmosFigures, type CmosRow } from "./cmos";

const MEMORY =
  "From memory; no highest delay given. Inputs at TTL highs take more current at rest, see additional supply current.";

const ROWS: Record<string, CmosRow> = {
  "00": ["gates", 22, "gate", 10, null, MEMORY],
  "04": ["gates", 24, "gate", 8, null, MEMORY],
  "08": ["gates", 20, "gate", 11, null, MEMORY],
  "32": ["gates", 28, "gate", 9, null, MEMORY],
  "74": ["flipFlops", 29, "gate", 15, null, MEMORY],
  "86": ["gates", 30, "gate", 14, null, MEMORY],
  "138": ["larger", 67, "package", 17, null, MEMORY],
  "244": ["larger", 35, "gate", 11, null, MEMORY],
  "245": ["larger", 30, "gate", 10, 28, "Read in a Philips sheet; highest at 4.5 V, 50 pF, −40 … 85 °C."],
  "373": ["larger", 41, "gate", 14, null, MEMORY],
  "574": ["larger", 25, "gate", 15, null, MEMORY],
};

/** Figures of the HCT family. */
export const HCT_FIGURES = cmosFigures(ROWS);
