"use server";
import { parseWithZod } from "@conform-to/zod/v4";
import { cookies, headers } from "next/headers";
import { redirect } from "next/navigation";
import { confirmIdentity } from "@/auth/confirm-identity";
import { currentWriter } from "@/auth/current-actor";
import { peerAddress } from "@/auth/peer-address";
import { signInWithPassword } from "@/auth/sign-in";
import { signOut } from "@/auth/sign-out";
import { spendEntryLink } from "@/auth/spend-entry-link";
import type { FormReply } from "@/data/edge/form-reply";
import { formatDuration } from "@/format/format-duration";
import { signInInput, welcomeInput } from "./inputs";
import { sameSitePath } from "./same-site-path";

type Previous = FormReply | undefined;

export async function signInAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const submission = parseWithZod(data, { schema: signInInput, disableAutoCoercion: true });
  const hideFields = ["password"];
  if (submission.status !== "success") return submission.reply({ hideFields });
  const { email, password, next } = submission.value;
  const browser = ((await headers()).get("user-agent") ?? "").slice(0, 300);
  const answer = await signInWithPassword(context, { email, password, peer: await peerAddress(), browser });
  if ("waitSeconds" in answer)
    return submission.reply({
      hideFields,
      formErrors: [`Too many wrong tries. Please try again in ${formatDuration(answer.waitSeconds * 1000)}.`],
    });
  if ("wrong" in answer)
    return submission.reply({ hideFields, formErrors: ["E-mail and password do not belong together."] });
  (await cookies()).set(answer.cookie.name, answer.cookie.value, answer.cookie.attributes);
  redirect(sameSitePath(next));
}

/** The person whose set-up link it is chooses a password and is signed in. */
export async function welcomeAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const submission = parseWithZod(data, { schema: welcomeInput, disableAutoCoercion: true });
  const hideFields = ["password"];
  if (submission.status !== "success") return submission.reply({ hideFields });
  const browser = ((await headers()).get("user-agent") ?? "").slice(0, 300);
  const answer = await spendEntryLink(context, { ...submission.value, peer: await peerAddress(), browser });
  if ("cookie" in answer) {
    (await cookies()).set(answer.cookie.name, answer.cookie.value, answer.cookie.attributes);
    redirect("/");
  }
  if ("problem" in answer)
    return submission.reply({ hideFields, fieldErrors: { password: [answer.problem] } });
  return submission.reply({
    hideFields,
    formErrors: [
      "gone" in answer
        ? "This link has been used, replaced or has run out. Ask the lab for a new one."
        : `Too many tries. Please try again in ${formatDuration(answer.waitSeconds * 1000)}.`,
    ],
  });
}

export async function signOutAction(): Promise<void> {
  const context = await currentWriter();
  if (context.actor.kind === "person") {
    const { name, value, attributes } = await signOut(context);
    (await cookies()).set(name, value, attributes);
  }
  redirect("/sign-in");
}

/** The password once more, for the dialog that forms ask for. Null when it was right, otherwise what to say. */
export async function confirmIdentityAction(password: string): Promise<string | null> {
  const context = await currentWriter();
  const answer = await confirmIdentity(context, String(password).slice(0, 1000), await peerAddress());
  if (answer === "confirmed") return null;
  if (answer === "wrong") return "That is not your password.";
  return `Too many wrong tries. Please try again in ${formatDuration(answer.waitSeconds * 1000)}.`;
}
