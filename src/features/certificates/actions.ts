"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "../../auth/current-actor";
import {
  reissueCertificate,
  releaseCertificate,
  revokeCertificate,
  sendBackSet,
} from "../../data/certificates";
import { answerForm } from "../../data/edge/answer-form";
import type { FormReply } from "../../data/edge/form-reply";

type Previous = FormReply | undefined;

export async function sendBackSetAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => sendBackSet(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/sets/${result.setId}`);
}

export async function releaseCertificateAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => releaseCertificate(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/certificates/${result.certificateId}`);
}

export async function reissueCertificateAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => reissueCertificate(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/certificates/${result.certificateId}`);
}

export async function revokeCertificateAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => revokeCertificate(context, payload));
  if (!result) return reply;
  revalidatePath(`/sets/${result.setId}`);
  redirect(`/certificates/${result.certificateId}`);
}
