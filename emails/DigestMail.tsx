import { Link } from "@react-email/components";
import type { DigestMailProps } from "./parts/digest-mail-props";
import { DigestBoards } from "./parts/DigestBoards";
import { DigestEntries } from "./parts/DigestEntries";
import { DigestItems, More } from "./parts/DigestItems";
import { DigestPassed } from "./parts/DigestPassed";
import { DigestWiring } from "./parts/DigestWiring";
import { PartHeading } from "./parts/Heading";
import { light } from "./parts/palette";
import { Sheet } from "./parts/Sheet";
import { Act, Line, Title } from "./parts/Words";

export const digestSubject = ({ projectName, headline }: DigestMailProps): string => `${projectName}: ${headline}`;

/** The week of one project: how the boards stand, what happened, what is open and what comes next. */
export function DigestMail(props: DigestMailProps) {
  const { projectName, projectLink, logLink, period, summary, standing, outlook, isQuiet } = props;
  const { boards, passed, failed, decided, entries, also, open, next, wiring } = props;
  return (
    <Sheet preheader={`${summary} ${standing}`} footer={<Footer {...props} />}>
      <Title>{projectName}</Title>
      <Line soft>{period}</Line>
      <Line>
        <b>{summary}</b> {standing}
      </Line>
      {outlook !== "" && <Line soft>{outlook}</Line>}
      {isQuiet ? null : (
        <>
          <Act href={projectLink}>Open the rack</Act>
          <PartHeading>Where the boards stand</PartHeading>
          <DigestBoards boards={boards} link={projectLink} />
          {failed.items.length > 0 && <PartHeading>Did not conform this week</PartHeading>}
          <DigestItems list={failed} moreLink={logLink} />
          {decided.items.length > 0 && <PartHeading>Reopened, conceded, in doubt</PartHeading>}
          <DigestItems list={decided} moreLink={logLink} />
          {passed.lines.length > 0 && <PartHeading>Passed this week</PartHeading>}
          <DigestPassed lines={passed.lines} />
          <More count={passed.more} link={logLink} />
          {entries.lines.length > 0 && <PartHeading>New in the log</PartHeading>}
          <DigestEntries lines={entries.lines} />
          <More count={entries.more} link={logLink} />
          {also.sentences.length > 0 && <PartHeading>Also</PartHeading>}
          {also.sentences.map(({ text, link }) => (
            <Line key={text + link} soft>
              <Link href={link} style={{ color: light.inkSoft }}>
                {text}
              </Link>
            </Line>
          ))}
          <More count={also.more} link={logLink} />
          {open.items.length > 0 && <PartHeading>Open failures</PartHeading>}
          <DigestItems list={open} moreLink={projectLink} />
          {wiring && <DigestWiring wiring={wiring} />}
        </>
      )}
      {next.items.length > 0 && <PartHeading>Next on the bench</PartHeading>}
      <DigestItems list={isQuiet ? { items: next.items.slice(0, 1), more: 0 } : next} moreLink={projectLink} />
    </Sheet>
  );
}

function Footer({ projectName, settingsLink, unsubscribeLink }: DigestMailProps) {
  return (
    <>
      You get this once a week because you follow {projectName}. Another day or hour:{" "}
      <Link href={settingsLink} style={{ color: light.inkSoft, textDecoration: "underline" }}>
        your settings
      </Link>
      . No more of these:{" "}
      <Link href={unsubscribeLink} style={{ color: light.inkSoft, textDecoration: "underline" }}>
        unsubscribe
      </Link>
      .
    </>
  );
}
