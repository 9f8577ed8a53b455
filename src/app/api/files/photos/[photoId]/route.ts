import { currentContext } from "../../../../../auth/current-actor";
import { answerRequest } from "../../../../../data/edge/answer-request";
import { fileResponse } from "../../../../../data/edge/file-response";
import { getPhotoFile } from "../../../../../data/photos";

type Address = { params: Promise<{ photoId: string }> };

export function GET(request: Request, { params }: Address) {
  return answerRequest(async () => {
    const { photoId } = await params;
    const size = new URL(request.url).searchParams.get("size");
    const { bytes, mediaType, number } = await getPhotoFile(await currentContext(), { photoId, size });
    return fileResponse({ bytes, mediaType, name: `${number} photo.jpg` });
  });
}
