import { currentContext } from "@/auth/current-actor";
import { answerRequest } from "@/data/edge/answer-request";
import { fileResponse } from "@/data/edge/file-response";
import { getBagLabels } from "@/data/sets";

type Address = { params: Promise<{ setId: string }> };

export function GET(request: Request, { params }: Address) {
  return answerRequest(async () => {
    const { setId } = await params;
    const size = new URL(request.url).searchParams.get("size");
    const { number, bytes } = await getBagLabels(await currentContext(), { setId, size });
    return fileResponse({ bytes, mediaType: "application/pdf", name: `labels ${number}.pdf` });
  });
}
