"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentContext, currentWriter } from "@/auth/current-actor";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import {
  checkInSet,
  clearSetHold,
  editIntake,
  findSet,
  handOverSet,
  holdSet,
  rejectInjector,
  replaceInjector,
  returnSetUncleaned,
} from "@/data/sets";

type Previous = FormReply | undefined;

export async function checkInSetAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => checkInSet(context, payload));
  if (!result) return reply;
  revalidatePath("/sets");
  redirect(`/sets/${result.setId}/checked-in`);
}

export async function editIntakeAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => editIntake(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}

export async function handOverSetAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => handOverSet(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}

export async function holdSetAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => holdSet(context, payload));
  if (result) revalidatePath(`/sets/${result.setId}`);
  return reply;
}

export async function clearSetHoldAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => clearSetHold(context, payload));
  if (result) revalidatePath(`/sets/${result.setId}`);
  return reply;
}

export async function returnSetUncleanedAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => returnSetUncleaned(context, payload));
  if (result) revalidatePath(`/sets/${result.setId}`);
  return reply;
}

export async function rejectInjectorAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => rejectInjector(context, payload));
  if (result) revalidatePath(`/sets/${result.setId}`);
  return reply;
}

export async function replaceInjectorAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => replaceInjector(context, payload));
  if (result) revalidatePath(`/sets/${result.setId}`);
  return reply;
}

/** A scanned label, a tag, a number or a serial leads straight to its set; anything else to a search. */
export async function jumpToSetAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentContext();
  const typed = String(data.get("typed") ?? "").trim();
  const { reply, result } = await answerForm(data, async (payload) => ({
    found: await findSet(context, payload),
  }));
  if (!result) return reply;
  redirect(
    result.found ? `/sets/${result.found.setId}` : `/sets?view=all&search=${encodeURIComponent(typed)}`,
  );
}
