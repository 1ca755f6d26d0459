export { CHECK_STAGES, holds, type CheckStage, type CheckState, type StandingCheck } from "./standing-check";
