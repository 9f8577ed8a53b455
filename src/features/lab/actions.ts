"use server";
import { revalidatePath } from "next/cache";
import { currentWriter } from "@/auth/current-actor";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { editLabDetails } from "@/data/lab";

export async function editLabDetailsAction(
  _previous: FormReply | undefined,
  data: FormData,
): Promise<FormReply> {
  const context = await currentWriter();
  const done = "Saved. It holds from the next certificate and the next cycle on.";
  const { reply, result } = await answerForm(data, (payload) => editLabDetails(context, payload), { done });
  if (result) revalidatePath("/settings");
  return reply;
}
