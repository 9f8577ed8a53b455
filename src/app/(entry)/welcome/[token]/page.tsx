import type { Metadata } from "next";
import { connection } from "next/server";
import { WelcomeForm } from "@/features/entry/welcome-form";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Set up your account", referrer: "no-referrer" };

export default async function WelcomePage({ params }: PageProps<"/welcome/[token]">) {
  await connection();
  const { token } = await params;
  return (
    <Sheet title="Set up your account">
      <WelcomeForm token={token} />
    </Sheet>
  );
}
