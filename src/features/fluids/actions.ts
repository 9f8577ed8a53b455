"use server";
import { revalidatePath } from "next/cache";
import { currentWriter } from "@/auth/current-actor";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { addFluid, setFluidRetired } from "@/data/fluids";

type Previous = FormReply | undefined;

export async function addFluidAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => addFluid(context, payload), {
    done: "Added.",
  });
  if (result) revalidatePath("/settings/fluids");
  return reply;
}

export async function setFluidRetiredAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => setFluidRetired(context, payload));
  if (result) revalidatePath("/settings/fluids");
  return reply;
}
