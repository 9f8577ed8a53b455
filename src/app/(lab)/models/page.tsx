import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { answerPage } from "@/data/edge/answer-page";
import { listModels } from "@/data/models";
import { formatNumber, formatRange } from "@/format/format-number";
import { StatusMark } from "@/ui/feedback/status-mark";
import { ButtonLink } from "@/ui/layout/button-link";
import { DataTable } from "@/ui/layout/data-table";
import { EmptyState } from "@/ui/layout/empty-state";
import { pagerOf, readListPage } from "@/ui/layout/list-page";
import { ListSearch } from "@/ui/layout/list-search";
import { PageHeader } from "@/ui/layout/page-header";
import { Pager } from "@/ui/layout/pager";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Injector models" };

export default async function ModelsPage({ searchParams }: PageProps<"/models">) {
  const page = readListPage(await searchParams);
  const context = await currentContext();
  const { rows, total } = await answerPage(listModels(context, page));
  const isManager = rolesOf(context.actor).includes("manager");
  return (
    <>
      <PageHeader
        title="Injector models"
        actions={
          isManager ? (
            <>
              <ButtonLink href="/models/import">Import a CSV file</ButtonLink>
              <ButtonLink kind="primary" href="/models/new">
                Add a model
              </ButtonLink>
            </>
          ) : null
        }
      />
      <ListSearch label="Search models" placeholder="Make or part number" search={page.search} />
      <Sheet padding="none">
        <DataTable
          caption="Injector models"
          rows={rows}
          rowKey={({ modelId }) => modelId}
          rowHref={isManager ? ({ modelId }) => `/models/${modelId}` : undefined}
          columns={[
            { key: "name", head: "Model", cell: ({ make, partNumber }) => `${make} ${partNumber}` },
            { key: "band", head: "Impedance", cell: ({ impedanceBand }) => impedanceBand },
            {
              key: "ohms",
              head: "Winding",
              align: "right",
              cell: ({ resistanceLowOhm, resistanceHighOhm }) =>
                formatRange(resistanceLowOhm, resistanceHighOhm, "resistance"),
            },
            {
              key: "flow",
              head: "Rated flow",
              unit: "mL/min",
              align: "right",
              cell: ({ ratedFlowMlPerMin, ratedFlowBandPercent }) =>
                `${formatNumber(ratedFlowMlPerMin, "staticFlow")} ± ${formatNumber(ratedFlowBandPercent, "tolerance")} %`,
            },
            {
              key: "pressure",
              head: "at",
              unit: "kPa",
              align: "right",
              cell: ({ ratedPressureKpa }) => formatNumber(ratedPressureKpa, "pressure"),
            },
            {
              key: "leakage",
              head: "Leakage limit",
              unit: "mm³/min",
              align: "right",
              cell: ({ leakageLimitMm3PerMin }) => formatNumber(leakageLimitMm3PerMin, "leakage"),
            },
            { key: "spray", head: "Spray", cell: ({ sprayType }) => sprayType },
            {
              key: "confirmed",
              head: "State",
              cell: ({ confirmed }) =>
                confirmed ? "confirmed" : <StatusMark kind="due">to be looked at</StatusMark>,
            },
          ]}
          empty={
            <EmptyState title={page.search ? "No model matches" : "No models yet"}>
              A model can also be entered while a set is checked in; the manager confirms it then.
            </EmptyState>
          }
        />
        <Pager {...pagerOf({ path: "/models", page, shown: rows.length, total })} />
      </Sheet>
    </>
  );
}
