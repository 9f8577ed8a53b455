import { headers } from "next/headers";
import { redirect } from "next/navigation";
import type { ReactNode } from "react";
import { currentContext } from "@/auth/current-actor";
import { IdentityDialog } from "@/features/entry/identity-dialog";
import { SignOutButton } from "@/features/entry/sign-out-button";
import { SetFinder } from "@/features/sets/set-finder";
import { joinWords } from "@/format/join-words";
import { AppShell } from "@/ui/layout/app-shell";
import { navigationFor } from "./navigation";

/** The frame of the lab's pages. It guards nothing: every page reads through the data layer, which does. */
export default async function LabLayout({ children }: { children: ReactNode }) {
  const { actor } = await currentContext();
  if (actor.kind !== "person") redirect(await signInFromHere());
  if (!actor.roles.some((role) => role !== "customer")) redirect("/my");
  const roles = actor.roles.map((role) => (role === "manager" ? "lab manager" : role));
  return (
    <IdentityDialog>
      <AppShell
        navigation={navigationFor(actor.roles)}
        person={{ name: actor.name, role: joinWords(roles), href: "/profile" }}
        finder={<SetFinder />}
        signOut={<SignOutButton />}
      >
        {children}
      </AppShell>
    </IdentityDialog>
  );
}

async function signInFromHere(): Promise<string> {
  const path = (await headers()).get("x-path");
  return path && path !== "/" ? `/sign-in?next=${encodeURIComponent(path)}` : "/sign-in";
}
