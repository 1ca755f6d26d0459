export {
  type Apart,
  type BoardLink,
  type BoardOrder,
  type BoardOrderInput,
  type BoardOrdering,
  type BoardOverride,
  type BoardRisk,
  type BoardStep,
} from "./board-order";
export {
  type CheckOrder,
  type Circle,
  type CriticalPath,
  type OpenCheck,
  type Ordered,
  type Schedule,
  type ScheduledCheck,
  type ScheduleRequest,
} from "./check-order";
export { orderChecks } from "./order-checks";
export { scheduleChecks } from "./schedule-checks";
export { orderBoards } from "./order-boards";
