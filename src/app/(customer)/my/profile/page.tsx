import type { Metadata } from "next";
import { currentContext } from "@/auth/current-actor";
import { answerPage } from "@/data/edge/answer-page";
import { getLabCard } from "@/data/lab";
import { getOwnProfile } from "@/data/people";
import { ProfileSheets } from "@/features/profile/profile-sheets";
import { PageHeader } from "@/ui/layout/page-header";

export const metadata: Metadata = { title: "My profile" };

export default async function ProfilePage() {
  const context = await currentContext();
  const profile = await answerPage(getOwnProfile(context));
  const { clock } = await answerPage(getLabCard(context));
  return (
    <>
      <PageHeader title={profile.name} subtitle="my profile" />
      <ProfileSheets profile={profile} clock={clock} />
    </>
  );
}
