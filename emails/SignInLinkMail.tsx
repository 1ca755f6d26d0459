import { Sheet } from "./parts/Sheet";
import { Act, Line, PlainAddress, Title } from "./parts/Words";

export type SignInLinkProps = { link: string; minutesValid: number };

export const signInLinkSubject = "Your sign-in link for Boardwake";

export function SignInLinkMail({ link, minutesValid }: SignInLinkProps) {
  return (
    <Sheet
      preheader={`Works for ${minutesValid} minutes, once.`}
      footer="You get this because somebody asked for a sign-in link for this address. If it was not you, do nothing."
    >
      <Title>Sign in</Title>
      <Line>The link opens a page with one button. Press it there and you are signed in on that device.</Line>
      <Act href={link}>Open the sign-in page</Act>
      <Line soft>The link works for {minutesValid} minutes, once.</Line>
      <PlainAddress href={link} />
    </Sheet>
  );
}
