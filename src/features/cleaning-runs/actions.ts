"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "../../auth/current-actor";
import { correctCleaningRun, recordCleaningRun } from "../../data/cleaning-runs";
import { answerForm } from "../../data/edge/answer-form";
import type { FormReply } from "../../data/edge/form-reply";

type Previous = FormReply | undefined;

export async function recordCleaningRunAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => recordCleaningRun(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}

export async function correctCleaningRunAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => correctCleaningRun(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}
