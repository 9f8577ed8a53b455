import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { answerPage } from "@/data/edge/answer-page";
import { getLabDetails } from "@/data/lab";
import { LabForm } from "@/features/lab/lab-form";
import { PageHeader } from "@/ui/layout/page-header";
import { SettingsTabs } from "./settings-tabs";

export const metadata: Metadata = { title: "Lab settings" };

export default async function SettingsPage() {
  const context = await currentContext();
  await answerPage(authorize(context, "editLabDetails"));
  const lab = await answerPage(getLabDetails(context));
  return (
    <>
      <PageHeader title="Lab settings" />
      <SettingsTabs />
      <LabForm key={lab.version} lab={lab} />
    </>
  );
}
