import { currentContext } from "../../../../auth/current-actor";
import { answerRequest } from "../../../../data/edge/answer-request";
import { listSets } from "../../../../data/sets";

export function GET(request: Request) {
  return answerRequest(async () =>
    listSets(await currentContext(), Object.fromEntries(new URL(request.url).searchParams)),
  );
}
