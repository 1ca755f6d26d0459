import { Sheet } from "./parts/Sheet";
import { Act, Line, PlainAddress, Title } from "./parts/Words";

export type ConfirmAddressProps = { name: string; link: string; hoursValid: number };

export const confirmAddressSubject = "Confirm your address for Boardwake";

export function ConfirmAddressMail({ name, link, hoursValid }: ConfirmAddressProps) {
  return (
    <Sheet
      preheader="Confirm that this address is yours."
      footer="You get this because somebody signed up with this address. If it was not you, do nothing: without it nothing is sent to you again."
    >
      <Title>Confirm your address</Title>
      <Line>
        Hello {name}, the page behind this link asks for your password once and confirms that this address is yours.
        Then invitations and the weekly digest reach you.
      </Line>
      <Act href={link}>Confirm my address</Act>
      <Line soft>The link works for {hoursValid} hours, once.</Line>
      <PlainAddress href={link} />
    </Sheet>
  );
}
