import { Sheet } from "./parts/Sheet";
import { Act, Line, PlainAddress, Title } from "./parts/Words";

export type ResetPasswordProps = { name: string; link: string; hoursValid: number };

export const resetPasswordSubject = "Set a new password for Boardwake";

export function ResetPasswordMail({ name, link, hoursValid }: ResetPasswordProps) {
  return (
    <Sheet
      preheader={`Works for ${hoursValid} hours, once.`}
      footer="You get this because somebody asked to reset the password of this address. If it was not you, do nothing: the old password stays."
    >
      <Title>Set a new password</Title>
      <Line>
        Hello {name}, choose a new password on the page behind this link. Every device that is signed in now is signed
        out then.
      </Line>
      <Act href={link}>Choose a new password</Act>
      <Line soft>The link works for {hoursValid} hours, once.</Line>
      <PlainAddress href={link} />
    </Sheet>
  );
}
