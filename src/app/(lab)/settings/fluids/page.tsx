import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { listFluids } from "@/data/fluids";
import { setFluidRetiredAction } from "@/features/fluids/actions";
import { AddFluidForm } from "@/features/fluids/add-fluid-form";
import { ActionButton } from "@/ui/form/action-button";
import { DataTable } from "@/ui/layout/data-table";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { SettingsTabs } from "../settings-tabs";

export const metadata: Metadata = { title: "Fluids" };

export default async function FluidsPage() {
  const context = await currentContext();
  await answerPage(authorize(context, "addFluid"));
  const fluids = await answerPage(listFluids(context, { withRetired: true }));
  return (
    <>
      <PageHeader title="Lab settings" />
      <SettingsTabs />
      <div className="flex flex-col gap-3.5">
        <Sheet title="Fluids" padding="none">
          <DataTable
            caption="Fluids"
            rows={fluids}
            rowKey={({ fluidId }) => fluidId}
            columns={[
              { key: "name", head: "Fluid", cell: ({ name }) => name },
              {
                key: "density",
                head: "Density at 15 °C",
                unit: "g/mL",
                align: "right",
                cell: ({ densityAt15GPerMl }) => densityAt15GPerMl ?? "published table",
              },
              {
                key: "expansion",
                head: "Expansion",
                unit: "per K",
                align: "right",
                cell: ({ expansionPerK }) => expansionPerK ?? "published table",
              },
              { key: "source", head: "Source", cell: ({ source }) => source, wrap: true },
              {
                key: "state",
                head: "State",
                cell: ({ fluidId, retired }) => (
                  <span className="flex items-center gap-3">
                    {retired ? "retired" : "in use"}
                    <ActionButton
                      action={setFluidRetiredAction}
                      fields={{ fluidId, retired: String(!retired) }}
                      size="small"
                      busyLabel="Saving"
                    >
                      {retired ? "Take back into use" : "Retire"}
                    </ActionButton>
                  </span>
                ),
              },
            ]}
          />
        </Sheet>
        <Sheet title="Add a fluid">
          <AddFluidForm />
        </Sheet>
      </div>
    </>
  );
}
