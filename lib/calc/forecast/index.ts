export { findPaces } from "./find-paces";
export { forecast } from "./forecast";
export { NO_PACES, type AttemptAt, type BenchSession, type CheckEvent, type Paces, type TypedSession } from "./history";
export { inferSessions } from "./infer-sessions";
export { type Forecast, type ForecastInput, type Week } from "./outlook";
export { median } from "./quantile";
