export {
  type PartsList,
  type PartsListInput,
  type PartsListLine,
  type PartsListProblem,
  type Price,
} from "./parts-list";
