import type { IndexedConnector, IndexedPin } from "../index-design";
import type { Survey } from "../survey";

export const partnersWithPins = (survey: Survey, connector: IndexedConnector) =>
  survey.partnersOf(connector).filter(({ partner }) => partner.pins.length > 0);

/** Pins on which every other half has what is asked for and this connector has nothing. */
export function offeredPins(survey: Survey, connector: IndexedConnector, wanted: (pin: IndexedPin) => boolean) {
  const [first, ...rest] = partnersWithPins(survey, connector);
  if (!first) return [];
  return first.partner.pins
    .filter((pin) => wanted(pin) && pin.signal !== "" && connector.face.pins.some(({ name }) => name === pin.name))
    .filter(({ name, signal }) =>
      rest.every(({ partner }) => partner.byName.get(name.toLowerCase())?.some((pin) => pin.signal === signal)),
    )
    .filter(({ name }) => (connector.byName.get(name.toLowerCase()) ?? []).every(isEmpty))
    .map(({ name, signal }) => ({ pin: name, signal }));
}

const isEmpty = ({ signal, design }: IndexedPin) =>
  signal === "" && (design.role === "passive" || design.role === "no connection");
