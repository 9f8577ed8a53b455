import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { listToleranceClasses } from "@/data/tolerance-classes";
import { setToleranceClassRetiredAction } from "@/features/tolerance-classes/actions";
import { formatQuantity } from "@/format/format-number";
import { ActionButton } from "@/ui/form/action-button";
import { ButtonLink } from "@/ui/layout/button-link";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { SettingsTabs } from "../settings-tabs";

export const metadata: Metadata = { title: "Tolerance classes" };

export default async function ClassesPage() {
  const context = await currentContext();
  await answerPage(authorize(context, "addToleranceClass"));
  const classes = await answerPage(listToleranceClasses(context, { withRetired: true }));
  return (
    <>
      <PageHeader
        title="Lab settings"
        actions={
          <ButtonLink href="/settings/classes/new" kind="primary">
            Add a class
          </ButtonLink>
        }
      />
      <SettingsTabs />
      <Sheet
        title="Tolerance classes"
        note="a change is a new revision; certificates keep theirs"
        padding="none"
      >
        <DataTable
          caption="Tolerance classes"
          rows={classes}
          rowKey={({ toleranceClassId }) => toleranceClassId}
          rowHref={({ toleranceClassId }) => `/settings/classes/${toleranceClassId}`}
          columns={[
            { key: "name", head: "Class", cell: ({ name }) => name },
            { key: "revision", head: "Revision", align: "right", cell: ({ latest }) => latest.revision },
            {
              key: "static",
              head: "Static flow spread",
              align: "right",
              cell: ({ latest }) => formatQuantity(latest.staticSpreadPercent, "tolerance"),
            },
            {
              key: "dead",
              head: "Dead time range",
              align: "right",
              cell: ({ latest }) => formatQuantity(latest.deadTimeRangeMs, "deadTime"),
            },
            {
              key: "limits",
              head: "Spread at widths",
              wrap: true,
              cell: ({ latest }) =>
                latest.spreadLimits
                  .map(
                    ({ fromPulseWidthMs, spreadPercent }) =>
                      `${formatQuantity(spreadPercent, "tolerance")} from ${formatQuantity(fromPulseWidthMs, "pulseWidth")}`,
                  )
                  .join(", "),
            },
            { key: "sets", head: "Sets", align: "right", cell: ({ setCount }) => setCount },
            {
              key: "state",
              head: "State",
              cell: ({ toleranceClassId, retired }) => (
                <span className="flex items-center gap-3">
                  {retired ? "retired" : "in use"}
                  <ActionButton
                    action={setToleranceClassRetiredAction}
                    fields={{ toleranceClassId, retired: String(!retired) }}
                    size="small"
                    busyLabel="Saving"
                  >
                    {retired ? "Take back" : "Retire"}
                  </ActionButton>
                </span>
              ),
            },
          ]}
          empty={<EmptyState title="No class yet">A set is judged by one: add the lab's first.</EmptyState>}
        />
      </Sheet>
    </>
  );
}
