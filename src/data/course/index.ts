import "server-only";

export { type LockedSet, lockSet } from "./lock-set";
export { beginCourse, moveStage } from "./move-stage";
export { requireOpenSet, requireOpenStage } from "./require-open-set";
