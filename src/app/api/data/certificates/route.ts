import { currentContext } from "@/auth/current-actor";
import { listCertificates } from "@/data/certificates";
import { answerRequest } from "@/data/edge/answer-request";

export function GET(request: Request) {
  return answerRequest(async () =>
    listCertificates(await currentContext(), Object.fromEntries(new URL(request.url).searchParams)),
  );
}
