import "server-only";

export { addModel } from "./add-model";
export { editModel } from "./edit-model";
export { findModels } from "./find-models";
export { getModel } from "./get-model";
export { importModels } from "./import-models";
export { insertModel, modelColumns, modelName } from "./internal";
export { listModels } from "./list-models";
export { previewModels } from "./preview-models";
export type * from "./types";
