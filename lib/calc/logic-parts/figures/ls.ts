import { type FamilyFigures } from "../part";

const NOTE = "From memory: highest supply current of the package; delays at 5 V, 25 °C, 15 pF (bus drivers 45 pF).";

/** Supply current at most in mA, delay typical and at most in ns. Bipolar parts have no Cpd worth naming at low clocks. */
const ROWS: Record<string, [milliamps: number, typicalNs: number | null, maxNs: number | null]> = {
  "00": [4.4, 10, 15],
  "02": [5.4, 10, 15],
  "03": [4.4, 17, 32],
  "04": [6.6, 10, 15],
  "05": [6.6, 17, 32],
  "08": [8.8, 10, 20],
  "10": [3.3, 10, 15],
  "11": [6.6, 10, 20],
  "14": [21, 15, 22],
  "20": [2.2, 10, 15],
  "21": [4.4, 10, 20],
  "27": [6.8, 10, 15],
  "30": [1.1, 13, 20],
  "32": [9.8, 14, 22],
  "74": [8, 25, 40],
  "86": [10, 20, 30],
  "132": [14, 15, 22],
  "138": [10, 27, 41],
  "139": [11, 25, 38],
  "151": [10, 27, 43],
  "153": [10, 25, 38],
  "157": [16, 18, 27],
  "161": [32, 18, 27],
  "163": [32, 18, 27],
  "164": [27, 21, 32],
  "174": [26, 21, 30],
  "175": [18, 21, 30],
  "193": [34, 25, 38],
  "240": [50, 12, 18],
  "244": [54, 12, 18],
  "245": [95, 8, 12],
  "273": [27, 18, 27],
  "283": [34, 16, 24],
  "373": [40, 18, 30],
  "374": [40, 19, 28],
  "377": [28, 18, 27],
  "541": [55, 12, 18],
};

/** Figures of the LS family. */
export const LS_FIGURES: Record<string, FamilyFigures> = Object.fromEntries(
  Object.entries(ROWS).map(([number, [milliamps, typical, max]]) => [
    number,
    {
      staticA: milliamps / 1000,
      cpdPf: null,
      cpdPer: "gate",
      tpdTypicalS: typical === null ? null : typical / 1e9,
      tpdMaxS: max === null ? null : max / 1e9,
      note: NOTE,
    },
  ]),
);
