import "server-only";

export { addFluid } from "./add-fluid";
export { listFluids } from "./list-fluids";
export { setFluidRetired } from "./set-fluid-retired";
