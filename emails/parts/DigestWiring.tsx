import { Link } from "@react-email/components";
import type { FindingsLine } from "./digest-mail-props";
import { More } from "./DigestItems";
import { PartHeading } from "./Heading";
import { light } from "./palette";
import { Line } from "./Words";

/** What the rule check has open, and the new ones by name. */
export function DigestWiring({ wiring }: { wiring: FindingsLine }) {
  const { sentence, link, fresh, more } = wiring;
  return (
    <>
      <PartHeading>In the wiring</PartHeading>
      <Line>
        <Link href={link} style={{ color: light.ink }}>
          {sentence}
        </Link>
      </Line>
      {fresh.map((title) => (
        <Line key={title} soft>
          New: {title}
        </Line>
      ))}
      <More count={more} link={link} />
    </>
  );
}
