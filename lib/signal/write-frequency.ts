import { formatQuantity } from "@/lib/calc/units";

/** "1 MHz"; empty when it is not said. */
export const writeFrequency = (hertz: number | null): string =>
  hertz === null ? "" : formatQuantity({ value: hertz, unit: "Hz" });
