import { pinNamed, type ConnectorPin } from "../../connector";
import type { IndexedConnector, IndexedPin } from "../index-design";

export type PinInPlace = { pin: IndexedPin; at: ConnectorPin };

/** The listed pins that the face has, with where they stand on it. */
export const pinsInPlace = ({ pins, face }: IndexedConnector): PinInPlace[] =>
  pins.flatMap((pin) => {
    const at = pinNamed(face, pin.name);
    return at ? [{ pin, at }] : [];
  });

/** Distances on a grid are sums of pitches; this much is noise. */
export const SLACK_MM = 0.01;
