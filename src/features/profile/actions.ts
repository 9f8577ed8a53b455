"use server";
import { revalidatePath } from "next/cache";
import { currentWriter } from "@/auth/current-actor";
import { peerAddress } from "@/auth/peer-address";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { changeOwnPassword, endOwnSignIn } from "@/data/people";

type Previous = FormReply | undefined;

export async function changeOwnPasswordAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const peer = await peerAddress();
  const { reply } = await answerForm(data, (payload) => changeOwnPassword(context, payload, peer), {
    hide: ["oldPassword", "newPassword"],
    done: "The new password holds from now on. Every other sign-in of yours has ended.",
  });
  return reply;
}

export async function endOwnSignInAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => endOwnSignIn(context, payload));
  if (result) revalidatePath("/profile");
  return reply;
}
