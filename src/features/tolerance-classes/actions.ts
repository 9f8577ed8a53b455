"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "@/auth/current-actor";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { addToleranceClass, reviseToleranceClass, setToleranceClassRetired } from "@/data/tolerance-classes";

type Previous = FormReply | undefined;

export async function addToleranceClassAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => addToleranceClass(context, payload));
  if (!result) return reply;
  revalidatePath("/settings/classes");
  redirect("/settings/classes");
}

export async function reviseToleranceClassAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => reviseToleranceClass(context, payload));
  if (!result) return reply;
  revalidatePath("/settings/classes");
  redirect("/settings/classes");
}

export async function setToleranceClassRetiredAction(
  _previous: Previous,
  data: FormData,
): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => setToleranceClassRetired(context, payload));
  if (result) revalidatePath("/settings/classes");
  return reply;
}
