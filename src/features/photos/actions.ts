"use server";
import { revalidatePath } from "next/cache";
import { currentWriter } from "@/auth/current-actor";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { hidePhoto } from "@/data/photos";

export async function hidePhotoAction(_previous: FormReply | undefined, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => hidePhoto(context, payload));
  if (result) revalidatePath(`/sets/${result.setId}`);
  return reply;
}
