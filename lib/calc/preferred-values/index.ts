export { hundredsOf, SERIES_NAMES, type SeriesName } from "./series";
export { nearestValue, nextDown, nextUp, valuesBetween } from "./step";
