import { currentContext } from "../../../../../auth/current-actor";
import { answerRequest } from "../../../../../data/edge/answer-request";
import { findKnownInjectors } from "../../../../../data/sets";

/** What is known of the serials of a model while they are typed. */
export function GET(request: Request) {
  return answerRequest(async () => {
    const asked = new URL(request.url).searchParams;
    return findKnownInjectors(await currentContext(), {
      modelId: asked.get("modelId"),
      serials: asked.getAll("serial"),
    });
  });
}
