import "server-only";

export { addToleranceClass } from "./add-tolerance-class";
export { getToleranceClass } from "./get-tolerance-class";
export type { ToleranceClassRevision } from "./internal";
export { listToleranceClasses } from "./list-tolerance-classes";
export { reviseToleranceClass } from "./revise-tolerance-class";
export { setToleranceClassRetired } from "./set-tolerance-class-retired";
