import "server-only";

export { editLabDetails } from "./edit-lab-details";
export { getLabDetails, type LabDetails } from "./get-lab-details";
