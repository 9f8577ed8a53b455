import "server-only";

export { addPerson } from "./add-person";
export { changeOwnPassword } from "./change-own-password";
export { endOwnSignIn } from "./end-own-sign-in";
export { endPersonSignIns } from "./end-person-sign-ins";
export { getOwnProfile } from "./get-own-profile";
export { getPerson } from "./get-person";
export { listPeople } from "./list-people";
export { renewEntryLink } from "./renew-entry-link";
export { setPersonActive } from "./set-person-active";
export { setPersonRoles } from "./set-person-roles";
