import { currentContext } from "../../../../../auth/current-actor";
import { getReadingFile } from "../../../../../data/cycles";
import { answerRequest } from "../../../../../data/edge/answer-request";
import { fileResponse } from "../../../../../data/edge/file-response";

export function GET(_request: Request, { params }: { params: Promise<{ readingFileId: string }> }) {
  return answerRequest(async () => {
    const { name, bytes } = await getReadingFile(await currentContext(), await params);
    return fileResponse({ bytes, name, mediaType: "text/csv; charset=utf-8", saved: true });
  });
}
