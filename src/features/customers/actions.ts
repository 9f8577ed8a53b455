"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "@/auth/current-actor";
import { addCustomer, editCustomer } from "@/data/customers";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";

type Previous = FormReply | undefined;

export async function addCustomerAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => addCustomer(context, payload));
  if (!result) return reply;
  revalidatePath("/customers");
  redirect(`/customers/${result.customerId}`);
}

export async function editCustomerAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => editCustomer(context, payload));
  if (!result) return reply;
  revalidatePath(`/customers/${result.customerId}`);
  redirect(`/customers/${result.customerId}`);
}
