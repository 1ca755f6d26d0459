import { Sheet } from "./parts/Sheet";
import { Act, Line, PlainAddress, Title } from "./parts/Words";

export type CheckReopenedProps = {
  name: string;
  projectName: string;
  serial: string;
  title: string;
  reopenedBy: string;
  reason: string;
  lastReading: string;
  link: string;
  settingsLink: string;
};

export const checkReopenedSubject = (serial: string, title: string) => `Reopened: ${title} (${serial})`;

export function CheckReopenedMail(props: CheckReopenedProps) {
  return (
    <Sheet
      preheader={props.reason}
      footer={
        <>
          You get this because you recorded this check. Turn these mails off in your settings:{" "}
          <a href={props.settingsLink}>{props.settingsLink}</a>
        </>
      }
    >
      <Title>
        {props.serial}: {props.title}
      </Title>
      <Line>
        Hello {props.name}, {props.reopenedBy} reopened this check on {props.projectName}. It is to be repeated.
      </Line>
      <Line>“{props.reason}”</Line>
      {props.lastReading ? <Line soft>You recorded: {props.lastReading}</Line> : null}
      <Act href={props.link}>Go to the check</Act>
      <PlainAddress href={props.link} />
    </Sheet>
  );
}
