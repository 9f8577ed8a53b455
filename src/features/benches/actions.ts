"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "@/auth/current-actor";
import {
  addBench,
  clearBenchHold,
  editBench,
  editInstrument,
  holdBench,
  placeInstrument,
} from "@/data/benches";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";

type Previous = FormReply | undefined;

export async function addBenchAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => addBench(context, payload));
  if (!result) return reply;
  revalidatePath("/calibration");
  redirect(`/calibration/${result.benchId}`);
}

export async function editBenchAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => editBench(context, payload));
  if (!result) return reply;
  revalidatePath("/calibration");
  redirect(`/calibration/${result.benchId}`);
}

export async function holdBenchAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => holdBench(context, payload));
  if (result) revalidatePath("/calibration", "layout");
  return reply;
}

export async function clearBenchHoldAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => clearBenchHold(context, payload));
  if (result) revalidatePath("/calibration", "layout");
  return reply;
}

export async function editInstrumentAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => editInstrument(context, payload));
  if (result) revalidatePath("/calibration", "layout");
  return reply;
}

export async function placeInstrumentAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => placeInstrument(context, payload));
  if (result) revalidatePath("/calibration", "layout");
  return reply;
}
