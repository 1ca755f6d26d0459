export { busNames } from "./bus-range";
export { signalKey, signalKeys } from "./signal-key";
