import "server-only";
import { parse, type Submission } from "@conform-to/dom";
import { isRefusal, type Refusal } from "../access/errors";
import type { FormReply } from "./form-reply";
import { reportUnexpected } from "./report-unexpected";

type Options = {
  /** Fields that are never sent back, such as passwords. */
  hide?: string[];
  /** The sentence shown when the form stays on its page. */
  done?: string;
};

type Answer<Result> = { reply: FormReply; result?: undefined } | { reply: FormReply; result: Result };

/**
 * Runs a verb on what a form sent. A refusal becomes the form's reply; a result is handed back, so that the action can
 * revalidate and redirect outside of this call.
 */
export async function answerForm<Result>(
  data: FormData,
  verb: (payload: Record<string, unknown>) => Promise<Result>,
  { hide = [], done }: Options = {},
): Promise<Answer<Result>> {
  const form = parse<Record<string, unknown>, string[]>(data, { resolve: (payload) => ({ value: payload }) });
  const hideFields = hide.length > 0 ? hide : undefined;
  try {
    const result = await verb(form.payload);
    return { reply: { ...form.reply({ hideFields }), ...(done ? { done } : {}) }, result };
  } catch (error) {
    if (isRefusal(error)) return { reply: { ...refusalReply(form, error, hideFields), ...extras(error) } };
    const requestId = reportUnexpected(error);
    return {
      reply: form.reply({ hideFields, formErrors: [`Something went wrong on our side (${requestId}).`] }),
    };
  }
}

type Form = Submission<Record<string, unknown>, string[]>;

function refusalReply(form: Form, error: Refusal, hideFields?: string[]): FormReply {
  const formErrors = [error.message];
  if (isRefusal(error, "invalid"))
    return form.reply({ hideFields, fieldErrors: error.details.fields, formErrors });
  if (isRefusal(error, "refused"))
    return form.reply({ hideFields, formErrors: [...formErrors, ...error.details.missing] });
  return form.reply({ hideFields, formErrors });
}

function extras(error: Refusal): Partial<FormReply> {
  if (isRefusal(error, "conflict")) return { conflict: error.details.values };
  return isRefusal(error, "confirm who you are") ? { confirmWhoYouAre: true } : {};
}
