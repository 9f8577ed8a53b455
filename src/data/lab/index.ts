import "server-only";

export { editLabDetails } from "./edit-lab-details";
export { getLabCard } from "./get-lab-card";
export { getLabDetails, type LabDetails } from "./get-lab-details";
