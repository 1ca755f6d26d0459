export { FAMILIES, findFamily } from "./families";
export { type Family, type SupplyRange } from "./family";
