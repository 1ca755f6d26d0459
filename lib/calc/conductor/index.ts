export {
  conductorCurrent,
  conductorWidth,
  OUNCE_COPPER_UM,
  type ConductorCurrent,
  type ConductorLayer,
  type ConductorWidth,
  type CurrentFit,
} from "./current";
export { conductorDrop, conductorOhm, sheetOhm, type Conductor, type ConductorDrop, type Copper } from "./resistance";
