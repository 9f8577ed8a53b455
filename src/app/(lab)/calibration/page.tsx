import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { listBenches } from "@/data/benches";
import { answerPage } from "@/data/edge/answer-page";
import { BenchStateMark } from "@/features/benches/bench-state";
import { formatRecordDayOf } from "@/format/format-date";
import { ButtonLink } from "@/ui/layout/button-link";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../lab-clock";

export const metadata: Metadata = { title: "Calibration" };

export default async function CalibrationPage() {
  const context = await currentContext();
  const benches = await answerPage(listBenches(context, { withRetired: true }));
  const { zone } = await labClock(context);
  const detailed = benches.some(({ detail }) => detail !== null);
  return (
    <>
      <PageHeader
        title="Calibration"
        subtitle="a cycle is recorded only where everything it rests on is in calibration"
        actions={
          rolesOf(context.actor).includes("manager") ? (
            <ButtonLink href="/calibration/new" kind="primary">
              Add a bench
            </ButtonLink>
          ) : null
        }
      />
      <Sheet title="Benches" padding="none">
        <DataTable
          caption="Benches"
          rows={benches}
          rowKey={({ benchId }) => benchId}
          rowHref={({ benchId }) => `/calibration/${benchId}`}
          columns={[
            { key: "code", head: "Bench", cell: ({ code }) => code },
            { key: "location", head: "Where", cell: ({ location }) => location },
            {
              key: "state",
              head: "State",
              cell: ({ state, calibratedUntil }) => (
                <BenchStateMark
                  state={state}
                  until={calibratedUntil && formatRecordDayOf(calibratedUntil, zone)}
                />
              ),
            },
            ...(detailed
              ? [
                  {
                    key: "channels",
                    head: "Channels",
                    align: "right" as const,
                    cell: ({ detail }: (typeof benches)[number]) => detail?.channelCount,
                  },
                  {
                    key: "lacks",
                    head: "Out of calibration",
                    wrap: true,
                    cell: ({ detail }: (typeof benches)[number]) =>
                      detail?.holdReason ?? (detail?.outOfCalibration.join(", ") || "none"),
                  },
                ]
              : []),
          ]}
          empty={
            <EmptyState title="No bench yet">
              The lab manager adds one, with its channels and instruments.
            </EmptyState>
          }
        />
      </Sheet>
    </>
  );
}
