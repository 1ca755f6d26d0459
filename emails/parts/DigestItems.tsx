import { Link, Text } from "@react-email/components";
import type { ReactNode } from "react";
import type { DigestList, Mark } from "./digest-mail-props";
import { FIGURE_FONT, light } from "./palette";

const WORDS: Record<Mark, string> = {
  failed: "Fails",
  reopened: "Reopened",
  doubtful: "In doubt",
  conceded: "Conceded",
  passed: "Passes now",
  free: "Free to do",
};
const COLOURS: Record<Mark, string> = {
  failed: light.failed,
  reopened: light.reopened,
  doubtful: light.doubtful,
  conceded: light.conceded,
  passed: light.passed,
  free: light.inkSoft,
};

/** Unit, title and state of a check, then what is to be said of it. */
export function DigestItems({ list, moreLink }: { list: DigestList; moreLink: string }) {
  return (
    <>
      {list.items.map(({ mark, serial, title, link, detail }, index) => (
        <Text
          key={`${link}${index}`}
          className="bw-ink"
          style={{ color: light.ink, fontSize: 15, lineHeight: "22px", margin: "0 0 12px" }}
        >
          <Serial>{serial}</Serial>{" "}
          <Link href={link} style={{ color: light.ink, fontWeight: 700 }}>
            {title}
          </Link>{" "}
          <span
            className={mark === "free" ? "bw-soft" : `bw-${mark}`}
            style={{ color: COLOURS[mark], fontWeight: 700 }}
          >
            {WORDS[mark]}
          </span>
          <br />
          <span className="bw-soft" style={{ color: light.inkSoft }}>
            {detail}
          </span>
        </Text>
      ))}
      <More count={list.more} link={moreLink} />
    </>
  );
}

export function Serial({ children }: { children: ReactNode }) {
  return <span style={{ fontFamily: FIGURE_FONT, fontSize: 13, whiteSpace: "nowrap" }}>{children}</span>;
}

export function More({ count, link }: { count: number; link: string }) {
  if (count === 0) return null;
  return (
    <Text className="bw-copper" style={{ fontSize: 14, lineHeight: "20px", margin: "0 0 12px" }}>
      <Link href={link} style={{ color: light.copper }}>
        and {count} more
      </Link>
    </Text>
  );
}
