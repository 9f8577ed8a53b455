import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { currentContext } from "@/auth/current-actor";
import { sameSitePath } from "@/features/entry/same-site-path";
import { SignInForm } from "@/features/entry/sign-in-form";
import { Sheet } from "@/ui/layout/sheet";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({ searchParams }: PageProps<"/sign-in">) {
  const { next } = await searchParams;
  const target = sameSitePath(typeof next === "string" ? next : undefined);
  const { actor } = await currentContext();
  if (actor.kind === "person") redirect(target);
  return (
    <Sheet title="Sign in">
      <SignInForm next={target} />
    </Sheet>
  );
}
