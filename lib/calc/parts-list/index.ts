export { listParts, type PartsListResult } from "./list-parts";
export {
  type PartsList,
  type PartsListInput,
  type PartsListLine,
  type PartsListProblem,
  type Price,
} from "./parts-list";
