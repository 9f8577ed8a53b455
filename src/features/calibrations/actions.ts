"use server";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import { currentWriter } from "@/auth/current-actor";
import { correctCalibration, recordCalibrations, revokeCalibration } from "@/data/calibrations";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";

type Previous = FormReply | undefined;

export async function recordCalibrationsAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => recordCalibrations(context, payload));
  if (!result) return reply;
  revalidatePath("/calibration", "layout");
  redirect(`/calibration/${result.benchId}`);
}

export async function correctCalibrationAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => correctCalibration(context, payload));
  if (result) revalidatePath("/calibration", "layout");
  return reply;
}

export async function revokeCalibrationAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => revokeCalibration(context, payload));
  if (result) revalidatePath("/calibration", "layout");
  return reply;
}
