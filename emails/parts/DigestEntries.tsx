import { Img, Link, Text } from "@react-email/components";
import type { DigestPicture, EntryLine } from "./digest-mail-props";
import { light } from "./palette";

export function DigestEntries({ lines }: { lines: readonly EntryLine[] }) {
  return lines.map(({ title, link, by, excerpt, pictures }) => (
    <div key={link}>
      <Text className="bw-ink" style={{ color: light.ink, fontSize: 15, lineHeight: "22px", margin: "0 0 8px" }}>
        <Link href={link} style={{ color: light.ink, fontWeight: 700 }}>
          {title}
        </Link>
        <br />
        <span className="bw-soft" style={{ color: light.inkSoft, fontSize: 13 }}>
          {by}
        </span>
        {excerpt === "" ? null : (
          <>
            <br />
            {excerpt}
          </>
        )}
      </Text>
      {pictures.length === 0 ? null : <Pictures pictures={pictures} link={link} />}
    </div>
  ));
}

/** Inline blocks side by side where there is room, one under the other where there is none. */
function Pictures({ pictures, link }: { pictures: readonly DigestPicture[]; link: string }) {
  return (
    <div style={{ margin: "0 0 10px" }}>
      {pictures.map(({ contentId, caption, width, height }) => (
        <Link
          key={contentId}
          href={link}
          style={{ display: "inline-block", margin: "0 10px 10px 0", verticalAlign: "top", textDecoration: "none" }}
        >
          <Img
            src={`cid:${contentId}`}
            alt={caption}
            width={shownWidth(width, height)}
            className="bw-rule bw-soft"
            style={{
              border: `1px solid ${light.rule}`,
              borderRadius: 4,
              color: light.inkSoft,
              fontSize: 13,
              height: "auto",
              maxWidth: "100%",
            }}
          />
        </Link>
      ))}
    </div>
  );
}

/** Half its pixels, so that it is sharp on a phone; an upright picture is not let grow tall. */
function shownWidth(width: number, height: number): number {
  const widest = 230;
  const tallest = 200;
  return Math.round(Math.min(width, widest, (width / height) * tallest));
}
