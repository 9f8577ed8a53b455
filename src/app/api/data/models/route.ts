import { currentContext } from "../../../../auth/current-actor";
import { answerRequest } from "../../../../data/edge/answer-request";
import { findModels } from "../../../../data/models";

/** Makes and part numbers as they are typed. */
export function GET(request: Request) {
  return answerRequest(async () =>
    findModels(await currentContext(), Object.fromEntries(new URL(request.url).searchParams)),
  );
}
