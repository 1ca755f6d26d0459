"use client";

import { Panel } from "@/components/ui/Panel";
import { Tabs } from "@/components/ui/Tabs";

type Props = { subject: string; html: string; text: string };

/** The mail as two readers show it, and as text. The frames run nothing: no script, no form, no place of ours. */
export function MailPreview({ subject, html, text }: Props) {
  const tabs = [
    {
      id: "desk",
      label: "At the desk",
      content: <Frame html={html} title="The e-mail at desk width" width="max-w-[700px]" />,
    },
    {
      id: "phone",
      label: "On a phone",
      content: <Frame html={html} title="The e-mail at phone width" width="max-w-[390px]" />,
    },
    {
      id: "text",
      label: "As text",
      content: (
        <pre
          tabIndex={0}
          aria-label="The e-mail as text"
          className="mono max-h-[46rem] overflow-auto whitespace-pre-wrap break-words rounded border border-rule bg-raised p-4 text-sm"
        >
          {text}
        </pre>
      ),
    },
  ];
  return (
    <Panel title={subject}>
      <Tabs label="The e-mail" tabs={tabs} />
    </Panel>
  );
}

function Frame({ html, title, width }: { html: string; title: string; width: string }) {
  return (
    <iframe
      sandbox="allow-popups allow-popups-to-escape-sandbox"
      srcDoc={`<base target="_blank">${html}`}
      title={title}
      className={`mx-auto block h-[46rem] w-full rounded border border-rule ${width}`}
    />
  );
}
