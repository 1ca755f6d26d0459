import { Heading, Hr } from "@react-email/components";
import { light } from "./palette";

/** A part of a long mail, under a rule. */
export function PartHeading({ children }: { children: string }) {
  return (
    <>
      <Hr className="bw-rule" style={{ borderColor: light.rule, borderTopWidth: 1, margin: "22px 0 16px" }} />
      <Heading
        as="h2"
        className="bw-ink"
        style={{ color: light.ink, fontSize: 18, lineHeight: "24px", margin: "0 0 10px" }}
      >
        {children}
      </Heading>
    </>
  );
}
