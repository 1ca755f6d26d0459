import { Link, Text } from "@react-email/components";
import { Fragment } from "react";
import type { PassedLine } from "./digest-mail-props";
import { Serial } from "./DigestItems";
import { light } from "./palette";

/** One paragraph a unit: how many, then which. */
export function DigestPassed({ lines }: { lines: readonly PassedLine[] }) {
  return lines.map(({ serial, link, counts, checks, more }) => (
    <Text
      key={serial}
      className="bw-ink"
      style={{ color: light.ink, fontSize: 15, lineHeight: "22px", margin: "0 0 10px" }}
    >
      <Link href={link} style={{ color: light.ink, fontWeight: 700 }}>
        <Serial>{serial}</Serial>
      </Link>{" "}
      <span className="bw-passed" style={{ color: light.passed, fontWeight: 700 }}>
        {counts}
      </span>
      <br />
      {checks.map((check, index) => (
        <Fragment key={check.link}>
          {index > 0 ? " · " : null}
          <Link href={check.link} style={{ color: light.ink }}>
            {check.title}
          </Link>
        </Fragment>
      ))}
      {more > 0 ? (
        <>
          {" · "}
          <Link href={link} style={{ color: light.ink }}>
            {more} more
          </Link>
        </>
      ) : null}
    </Text>
  ));
}
