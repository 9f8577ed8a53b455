import { parse } from "@conform-to/dom";
import { unstable_isUnrecognizedActionError, unstable_rethrow } from "next/navigation";
import type { FormAction, FormReply } from "./reply";

/** Runs the action; when the server cannot be reached that is a reply too, since a thrown error would empty the page. */
export async function sendForm(
  action: FormAction,
  previous: FormReply | undefined,
  data: FormData,
): Promise<FormReply> {
  try {
    return await action(previous, data);
  } catch (error) {
    unstable_rethrow(error);
    const outOfDate = unstable_isUnrecognizedActionError(error);
    return unsent(
      data,
      outOfDate
        ? "The application was renewed and this page is out of date. What you typed is still here: copy it, then reload the page."
        : "The server could not be reached, so nothing was saved. What you typed is still here; please try again.",
    );
  }
}

function unsent(data: FormData, message: string): FormReply {
  const form = parse<never, string[]>(data, { resolve: () => ({ error: { "": [message] } }) });
  return form.reply();
}
