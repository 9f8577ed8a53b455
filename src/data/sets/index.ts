import "server-only";

export { moveStage, requireOpenSet } from "../course";
export { getSet } from "./get-set";
export type * from "./types";
