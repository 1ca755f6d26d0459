export { formatDuration } from "./format-duration";
export { formatLimits } from "./format-limits";
export { formatQuantity, type Digits } from "./format-quantity";
export { type Deviation, type Limits } from "./limits";
export { parseLimits, type ParsedLimits } from "./parse-limits";
export { parseQuantity, type ParsedQuantity } from "./parse-quantity";
export { shortQuantity } from "./short-quantity";
export { isUnit, unitLabel, UNITS, type Quantity, type Unit } from "./unit-list";
