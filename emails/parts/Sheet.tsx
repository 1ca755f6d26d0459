import { Body, Container, Head, Html, Preview, Section, Text } from "@react-email/components";
import type { ReactNode } from "react";
import { DARK_STYLE, light, TEXT_FONT } from "./palette";

/** The sheet every mail is written on. `preheader` is the line that a list of mails shows after the subject. */
export function Sheet({ preheader, footer, children }: { preheader: string; footer: ReactNode; children: ReactNode }) {
  return (
    <Html lang="en">
      <Head>
        <meta name="color-scheme" content="light dark" />
        <meta name="supported-color-schemes" content="light dark" />
        <style>{DARK_STYLE}</style>
      </Head>
      <Preview>{preheader}</Preview>
      <Body
        className="bw-paper"
        style={{ backgroundColor: light.paper, margin: 0, padding: "24px 8px", fontFamily: TEXT_FONT }}
      >
        <Container
          className="bw-sheet"
          style={{
            backgroundColor: light.sheet,
            border: `1px solid ${light.rule}`,
            borderRadius: 8,
            maxWidth: 600,
            padding: "0 24px 24px",
          }}
        >
          <Section style={{ padding: "20px 0 4px" }}>
            <Text className="bw-copper" style={{ color: light.copper, fontSize: 15, fontWeight: 700, margin: 0 }}>
              Boardwake
            </Text>
          </Section>
          {children}
        </Container>
        <Container style={{ maxWidth: 600, padding: "12px 24px" }}>
          <Text className="bw-soft" style={{ color: light.inkSoft, fontSize: 13, lineHeight: "20px", margin: 0 }}>
            {footer}
          </Text>
        </Container>
      </Body>
    </Html>
  );
}
