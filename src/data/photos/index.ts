import "server-only";

export { addPhoto } from "./add-photo";
export { getPhotoFile } from "./get-photo-file";
export { hidePhoto } from "./hide-photo";
