import { currentContext } from "../../../../auth/current-actor";
import { findCustomers } from "../../../../data/customers";
import { answerRequest } from "../../../../data/edge/answer-request";

/** Names as they are typed. */
export function GET(request: Request) {
  return answerRequest(async () =>
    findCustomers(await currentContext(), Object.fromEntries(new URL(request.url).searchParams)),
  );
}
