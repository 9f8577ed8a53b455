import "server-only";
import { forbidden, notFound, redirect } from "next/navigation";
import { isRefusal } from "../access/errors";

/** Reads for a page: a refusal becomes the framework's own page for it. Call it before anything is rendered. */
export async function answerPage<Result>(reading: Promise<Result>): Promise<Result> {
  try {
    return await reading;
  } catch (error) {
    if (isRefusal(error, "sign-in needed")) redirect("/sign-in");
    if (isRefusal(error, "forbidden")) forbidden();
    // An address that is not well formed leads to nothing, like one that is unknown.
    if (isRefusal(error, "not found") || isRefusal(error, "invalid")) notFound();
    throw error;
  }
}
