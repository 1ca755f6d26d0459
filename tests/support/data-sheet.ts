/** A family's figures as its sheet prints them, signs and all. */
export const SHEET = {
  volts: "4.5 V",
  vihMin: "3.15 V",
  vilMax: "1.35 V",
  vohMin: "3.84 V",
  iohA: "-4 mA",
  volMax: "0.33 V",
  iolA: "4 mA",
  iihA: "1 µA",
  iilA: "1 µA",
  iozA: "5 µA",
  inputPf: "3.5 pF",
  outputPf: "10 pF",
  tpdTypicalS: "9 ns",
  edgeS: "7 ns",
  inputMaxVolts: "",
  minVolts: "",
  maxVolts: "",
};
export type DataSheet = typeof SHEET;
