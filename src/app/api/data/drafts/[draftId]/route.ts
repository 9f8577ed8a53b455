import { currentContext, currentWriter } from "../../../../../auth/current-actor";
import { getCycleDraftChanges, saveCycleDraft } from "../../../../../data/cycles";
import { answerRequest } from "../../../../../data/edge/answer-request";

type Address = { params: Promise<{ draftId: string }> };

/** What others typed since the version that the page knows. */
export function GET(request: Request, { params }: Address) {
  return answerRequest(async () => {
    const { draftId } = await params;
    const version = new URL(request.url).searchParams.get("version");
    return getCycleDraftChanges(await currentContext(), { draftId, version });
  });
}

export function PATCH(request: Request, { params }: Address) {
  return answerRequest(async () => {
    const context = await currentWriter();
    const { draftId } = await params;
    const body: unknown = await request.json().catch(() => null);
    return saveCycleDraft(context, typeof body === "object" ? { ...body, draftId } : body);
  });
}
