import { type Decoupling } from "./packing";

const PACKAGE_FARAD = 100e-9;
const BULK_FARAD = 10e-6;
const PACKAGES_PER_BULK = 10;

/** Capacitors for so many packages. Common practice, no source; fast families and large drivers may want more. */
export const decouple = (packages: number): Decoupling => ({
  packageCapacitors: packages,
  packageFarad: PACKAGE_FARAD,
  bulkCapacitors: Math.ceil(packages / PACKAGES_PER_BULK),
  bulkFarad: BULK_FARAD,
  rule: `100 nF at the supply pins of every package, and 10 µF for every ${PACKAGES_PER_BULK} packages or part of them. Common practice, no source.`,
});
