import { redirect } from "next/navigation";
import type { ReactNode } from "react";
import { currentContext } from "@/auth/current-actor";
import { SignOutButton } from "@/features/entry/sign-out-button";
import { AppShell } from "@/ui/layout/app-shell";

const navigation = [
  { href: "/my", label: "My sets" },
  { href: "/my/certificates", label: "My certificates" },
];

/** The frame of a customer's pages. It guards nothing: what they show is scoped in the data layer. */
export default async function CustomerLayout({ children }: { children: ReactNode }) {
  const { actor } = await currentContext();
  if (actor.kind !== "person") redirect("/sign-in?next=/my");
  return (
    <AppShell
      navigation={navigation}
      person={{ name: actor.name, role: "customer", href: "/my/profile" }}
      signOut={<SignOutButton />}
      homeHref="/my"
    >
      {children}
    </AppShell>
  );
}
