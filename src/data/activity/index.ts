import "server-only";

export { listActivity } from "./list-activity";
