import "server-only";

export { checkInSet } from "./check-in-set";
export { clearSetHold } from "./clear-set-hold";
export { countSets } from "./count-sets";
export { editIntake } from "./edit-intake";
export { findKnownInjectors } from "./find-known-injectors";
export { findSet } from "./find-set";
export { getBagLabels } from "./get-bag-labels";
export { getSet } from "./get-set";
export { handOverSet } from "./hand-over-set";
export { holdSet } from "./hold-set";
export { setsWithin } from "./internal";
export { listSets } from "./list-sets";
export { rejectInjector } from "./reject-injector";
export { replaceInjector } from "./replace-injector";
export { returnSetUncleaned } from "./return-set-uncleaned";
export type * from "./types";
