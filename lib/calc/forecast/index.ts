export { type AttemptAt, type BenchSession, type CheckEvent, type Paces, type TypedSession } from "./history";
export { type Forecast, type ForecastInput, type Week } from "./outlook";
