import "server-only";

export { addCustomer } from "./add-customer";
export { editCustomer } from "./edit-customer";
export { findCustomers } from "./find-customers";
