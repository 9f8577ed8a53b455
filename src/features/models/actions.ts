"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "@/auth/current-actor";
import { isRefusal } from "@/data/access/errors";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { addModel, editModel, importModels, type ModelImportPreview, previewModels } from "@/data/models";

type Previous = FormReply | undefined;

export async function addModelAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => addModel(context, payload));
  if (!result) return reply;
  revalidatePath("/models");
  redirect("/models");
}

export async function editModelAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => editModel(context, payload));
  if (!result) return reply;
  revalidatePath("/models");
  redirect("/models");
}

export async function importModelsAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => importModels(context, payload));
  if (!result) return reply;
  revalidatePath("/models");
  redirect("/models");
}

/** What a file would bring, or why it cannot be read at all. */
export async function previewModelsAction(csv: string): Promise<ModelImportPreview | { message: string }> {
  const context = await currentWriter();
  try {
    return await previewModels(context, { csv });
  } catch (error) {
    if (!isRefusal(error)) throw error;
    const said = isRefusal(error, "invalid") ? Object.values(error.details.fields).flat() : [];
    return { message: said[0] ?? error.message };
  }
}
