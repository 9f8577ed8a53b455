import "server-only";

export { addBench } from "./add-bench";
export { clearBenchHold } from "./clear-bench-hold";
export { editBench } from "./edit-bench";
export { editInstrument } from "./edit-instrument";
export { getBench } from "./get-bench";
export { holdBench } from "./hold-bench";
export { listBenches } from "./list-benches";
export { certificatesResting } from "./load-calibrations";
export { placeInstrument } from "./place-instrument";
export type * from "./types";
