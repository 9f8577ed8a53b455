"use server";
import { revalidatePath } from "next/cache";
import { currentWriter } from "@/auth/current-actor";
import { answerForm } from "@/data/edge/answer-form";
import type { FormReply } from "@/data/edge/form-reply";
import { addPerson, endPersonSignIns, renewEntryLink, setPersonActive, setPersonRoles } from "@/data/people";

type Previous = FormReply | undefined;

export async function addPersonAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => addPerson(context, payload));
  if (!result) return reply;
  revalidatePath("/people");
  return { ...reply, done: linkWords(result.entryLink) };
}

export async function renewEntryLinkAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => renewEntryLink(context, payload));
  if (!result) return reply;
  revalidatePath("/people");
  return { ...reply, done: linkWords(result.entryLink) };
}

export async function setPersonRolesAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const done = "Saved. It holds from the person's next click.";
  const { reply, result } = await answerForm(data, (payload) => setPersonRoles(context, payload), { done });
  if (result) revalidatePath("/people");
  return reply;
}

export async function setPersonActiveAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const { reply, result } = await answerForm(data, (payload) => setPersonActive(context, payload));
  if (result) revalidatePath("/people");
  return reply;
}

export async function endPersonSignInsAction(_previous: Previous, data: FormData): Promise<FormReply> {
  const context = await currentWriter();
  const done = "Every open sign-in of this person has ended.";
  const { reply, result } = await answerForm(data, (payload) => endPersonSignIns(context, payload), { done });
  if (result) revalidatePath("/people");
  return reply;
}

/** The link is stored nowhere, so this is the only time it is shown. */
function linkWords(link: string | null): string {
  if (!link) return "The account is there already; make a new set-up link if theirs is lost.";
  return `Hand this link to the person. It is shown only now and works once, within 72 hours: ${link}`;
}
