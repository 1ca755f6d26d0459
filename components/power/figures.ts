import { formatQuantity, shortQuantity, type Unit } from "@/lib/calc/units";

export const amps = (value: number): string => shortQuantity(value, "A");
export const volts = (value: number): string => shortQuantity(value, "V");
export const watts = (value: number): string => shortQuantity(value, "W");
export const quantity = (value: number, unit: Unit): string => formatQuantity({ value, unit });

/** A share of one as per cent, for widths and for words. */
export const percent = (share: number): string => `${Math.round(share * 1000) / 10}%`;
