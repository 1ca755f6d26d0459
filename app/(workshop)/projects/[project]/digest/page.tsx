import type { Metadata } from "next";
import { DeliveryTable } from "@/components/digest/DeliveryTable";
import { MailPreview } from "@/components/digest/MailPreview";
import { SendToMe } from "@/components/digest/SendToMe";
import { SubscriberTable } from "@/components/digest/SubscriberTable";
import { Page } from "@/components/shell/Page";
import { Panel } from "@/components/ui/Panel";
import { definePage } from "@/lib/actions/define-page";
import { loadPreview } from "@/lib/digest/load-preview";
import { sendToMe } from "./actions";

export const metadata: Metadata = { title: "Weekly e-mail" };

export default definePage({
  permission: "digest.preview",
  path: ({ project }) => `/projects/${project}/digest`,
  render: async (scope) => {
    const { subject, html, text, subscribers, deliveries } = await loadPreview(scope);
    const zone = scope.viewer.timeZone;
    const readers = subscribers.filter((one) => one.enabled).length;
    return (
      <Page
        title="Weekly e-mail"
        lede={`The last seven days as they would go out now. ${readersText(readers)}`}
        actions={<SendToMe project={scope.slug} send={sendToMe} />}
      >
        <div className="flex flex-col gap-5">
          <MailPreview subject={subject} html={html} text={text} />
          <Panel title="Who gets it" padding="none">
            <SubscriberTable subscribers={subscribers} zone={zone} />
          </Panel>
          <Panel title="Sent lately" padding={deliveries.length > 0 ? "none" : "md"}>
            <DeliveryTable deliveries={deliveries} zone={zone} />
          </Panel>
        </div>
      </Page>
    );
  },
});

function readersText(count: number): string {
  if (count === 0) return "Nobody gets it yet.";
  return count === 1 ? "One person gets it." : `${count} people get it.`;
}
