"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "../../auth/current-actor";
import {
  openCycleCorrection,
  openCycleDraft,
  putAwayCycleDraft,
  recordCycle,
  recordCycleCorrection,
  sendToReview,
} from "../../data/cycles";
import { answerForm } from "../../data/edge/answer-form";
import type { FormReply } from "../../data/edge/form-reply";

type Previous = FormReply | undefined;

export async function openCycleDraftAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => openCycleDraft(context, payload));
  if (!result) return reply;
  redirect(`/bench/${result.draftId}`);
}

export async function openCycleCorrectionAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => openCycleCorrection(context, payload));
  if (!result) return reply;
  redirect(`/bench/${result.draftId}`);
}

export async function putAwayCycleDraftAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => putAwayCycleDraft(context, payload));
  if (!result) return reply;
  revalidatePath("/bench");
  redirect("/bench");
}

export async function recordCycleAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => recordCycle(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}

export async function recordCycleCorrectionAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => recordCycleCorrection(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}

export async function sendToReviewAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => sendToReview(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}
