import "server-only";

export { addCustomer } from "./add-customer";
export { editCustomer } from "./edit-customer";
export { findCustomers } from "./find-customers";
export { getCustomer } from "./get-customer";
export { customerName, insertCustomer } from "./internal";
export { listCustomers } from "./list-customers";
export type * from "./types";
