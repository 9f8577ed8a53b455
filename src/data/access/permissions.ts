import type { Role } from "../../db/vocabulary";

/**
 * Who may do what: the one list that the data layer and the tests read. A role that a row does not name is refused.
 * yes: any row of the noun. own: rows of the person's customers, or the person's own. name only, status: named columns.
 */
export type Right = "yes" | "own" | "name only" | "status";
type Rights = Partial<Record<Role | "anonymous" | "command", Right>>;
type Row = { resource: string; may: string; rights: Rights; condition?: string };

const everyone: Rights = {
  anonymous: "yes",
  customer: "yes",
  counter: "yes",
  technician: "yes",
  manager: "yes",
};
const staff: Rights = { counter: "yes", technician: "yes", manager: "yes" };
const manager: Rights = { manager: "yes" };

export const matrix = {
  1: { resource: "sign-in and password link", may: "use", rights: everyone, condition: "throttled" },
  2: {
    resource: "own profile and own open sign-ins",
    may: "read, change, end",
    rights: { customer: "own", counter: "own", technician: "own", manager: "own" },
    condition: "a password change asks for the old password",
  },
  3: {
    resource: "user account",
    may: "list, invite, disable, set role",
    rights: { manager: "yes", command: "yes" },
    condition: "not one's own role; at least one active manager remains",
  },
  4: { resource: "customer record", may: "create, change", rights: { counter: "yes", manager: "yes" } },
  5: {
    resource: "customer record",
    may: "read",
    rights: { customer: "own", counter: "yes", technician: "name only", manager: "yes" },
    condition: "technicians never see contact data",
  },
  6: {
    resource: "set",
    may: "check in",
    rights: { counter: "yes", manager: "yes" },
    condition: "injector not already in an open set",
  },
  7: {
    resource: "set",
    may: "read, list, search",
    rights: { ...staff, customer: "own" },
    condition: "customers never see internal notes or staff e-mail",
  },
  8: {
    resource: "set",
    may: "change intake data",
    rights: { counter: "yes", manager: "yes" },
    condition: "before the first cycle; the manager later, with a reason",
  },
  9: {
    resource: "set",
    may: "hand over",
    rights: { counter: "yes", manager: "yes" },
    condition: "certified, or a recorded reason for leaving without a certificate; once",
  },
  10: {
    resource: "cycle, injector checks, cleaning run",
    may: "create",
    rights: { technician: "yes" },
    condition: "set open, bench has a valid calibration now",
  },
  11: {
    resource: "cycle, injector checks, cleaning run",
    may: "read",
    rights: { ...staff, customer: "own" },
    condition: "customers once certified",
  },
  12: {
    resource: "cycle, injector checks, cleaning run",
    may: "change as a new revision",
    rights: { technician: "own" },
    condition: "before release, reason required",
  },
  13: {
    resource: "photo",
    may: "create",
    rights: { counter: "yes", technician: "yes" },
    condition: "set open; the counter intake photos only",
  },
  14: { resource: "photo", may: "read", rights: { ...staff, customer: "own" } },
  15: { resource: "photo", may: "hide with reason", rights: manager, condition: "row and file stay" },
  16: { resource: "CSV of readings", may: "create", rights: { technician: "yes" }, condition: "as row 10" },
  17: { resource: "CSV original", may: "download", rights: { technician: "yes", manager: "yes" } },
  18: {
    resource: "bench and calibration",
    may: "read",
    rights: { counter: "status", technician: "yes", manager: "yes" },
  },
  19: {
    resource: "calibration",
    may: "create, revoke",
    rights: manager,
    condition: "no overlap per instrument; revoke needs a reason",
  },
  20: {
    resource: "set results",
    may: "approve, send back",
    rights: manager,
    condition: "the approver recorded none of them; authenticated recently",
  },
  21: {
    resource: "certificate",
    may: "issue, supersede, revoke",
    rights: manager,
    condition: "approved, calibration valid, authenticated recently",
  },
  22: {
    resource: "certificate PDF",
    may: "download",
    rights: { ...staff, customer: "own" },
    condition: "customers issued ones; a superseded or revoked one shows its status first",
  },
  25: { resource: "activity record", may: "read, export", rights: manager },
  27: { resource: "health", may: "read", rights: everyone },
  28: {
    resource: "injector model, tolerance class, lab details, bench",
    may: "create, change",
    rights: manager,
  },
  29: { resource: "injector model, tolerance class", may: "read", rights: staff },
  30: {
    resource: "set",
    may: "put on hold, off hold, return uncleaned",
    rights: staff,
    condition: "reason required",
  },
  31: { resource: "bench", may: "put on hold", rights: { technician: "yes", manager: "yes" } },
  32: { resource: "bench", may: "clear a hold", rights: manager, condition: "with reason" },
  33: { resource: "bag label", may: "read", rights: staff },
  34: {
    resource: "data sheet",
    may: "download",
    rights: { ...staff, customer: "own" },
    condition: "customers issued ones",
  },
} as const satisfies Record<number, Row>;

export type RowNumber = keyof typeof matrix;
type VerbEntry = { row: RowNumber; writes?: true; recent?: true };

/** Every verb that src/data offers, with the row that decides it. */
export const verbs = {
  getOwnProfile: { row: 2 },
  endOwnSignIn: { row: 2, writes: true },
  changeOwnPassword: { row: 2, writes: true },
  listPeople: { row: 3 },
  getPerson: { row: 3 },
  addPerson: { row: 3, writes: true },
  setPersonActive: { row: 3, writes: true },
  setPersonRoles: { row: 3, writes: true, recent: true },
  renewEntryLink: { row: 3, writes: true },
  endPersonSignIns: { row: 3, writes: true },
  addCustomer: { row: 4, writes: true },
  editCustomer: { row: 4, writes: true },
  findCustomers: { row: 5 },
  listCustomers: { row: 5 },
  getCustomer: { row: 5 },
  checkInSet: { row: 6, writes: true },
  listSets: { row: 7 },
  countSets: { row: 7 },
  findSet: { row: 7 },
  getSet: { row: 7 },
  getLabCard: { row: 7 },
  findKnownInjectors: { row: 6 },
  editIntake: { row: 8, writes: true },
  handOverSet: { row: 9, writes: true },
  listBenchQueue: { row: 10 },
  openCycleDraft: { row: 10, writes: true },
  getCycleDraft: { row: 10 },
  getCycleDraftChanges: { row: 10 },
  saveCycleDraft: { row: 10, writes: true },
  putAwayCycleDraft: { row: 10, writes: true },
  recordCycle: { row: 10, writes: true },
  sendToReview: { row: 10, writes: true },
  rejectInjector: { row: 10, writes: true },
  replaceInjector: { row: 10, writes: true },
  recordCleaningRun: { row: 10, writes: true },
  getSetResults: { row: 11 },
  openCycleCorrection: { row: 12, writes: true },
  recordCycleCorrection: { row: 12, writes: true },
  correctCleaningRun: { row: 12, writes: true },
  addPhoto: { row: 13, writes: true },
  getPhotoFile: { row: 14 },
  hidePhoto: { row: 15, writes: true },
  previewReadingFile: { row: 16 },
  addReadingFile: { row: 16, writes: true },
  getReadingFile: { row: 17 },
  listBenches: { row: 18 },
  getBench: { row: 18 },
  recordCalibrations: { row: 19, writes: true },
  correctCalibration: { row: 19, writes: true },
  revokeCalibration: { row: 19, writes: true },
  sendBackSet: { row: 20, writes: true, recent: true },
  releaseCertificate: { row: 20, writes: true, recent: true },
  reissueCertificate: { row: 21, writes: true, recent: true },
  revokeCertificate: { row: 21, writes: true, recent: true },
  listCertificates: { row: 22 },
  getCertificate: { row: 22 },
  getCertificateFile: { row: 22 },
  listActivity: { row: 25 },
  addModel: { row: 28, writes: true },
  editModel: { row: 28, writes: true },
  previewModels: { row: 28 },
  importModels: { row: 28, writes: true },
  addToleranceClass: { row: 28, writes: true },
  reviseToleranceClass: { row: 28, writes: true },
  setToleranceClassRetired: { row: 28, writes: true },
  editLabDetails: { row: 28, writes: true },
  addFluid: { row: 28, writes: true },
  setFluidRetired: { row: 28, writes: true },
  addBench: { row: 28, writes: true },
  editBench: { row: 28, writes: true },
  editInstrument: { row: 28, writes: true },
  placeInstrument: { row: 28, writes: true },
  getLabDetails: { row: 29 },
  findModels: { row: 29 },
  listModels: { row: 29 },
  getModel: { row: 29 },
  listToleranceClasses: { row: 29 },
  getToleranceClass: { row: 29 },
  listFluids: { row: 18 },
  holdSet: { row: 30, writes: true },
  clearSetHold: { row: 30, writes: true },
  returnSetUncleaned: { row: 30, writes: true },
  holdBench: { row: 31, writes: true },
  clearBenchHold: { row: 32, writes: true },
  getBagLabels: { row: 33 },
  getDataSheet: { row: 34 },
} as const satisfies Record<string, VerbEntry>;

export type Verb = keyof typeof verbs;
export type WritingVerb = {
  [Name in Verb]: (typeof verbs)[Name] extends { writes: true } ? Name : never;
}[Verb];
export type ReadingVerb = Exclude<Verb, WritingVerb>;

export function rightsOf(verb: Verb): Rights {
  return matrix[verbs[verb].row].rights;
}

/** Release and its like ask that the person entered a password within the last minutes. */
export function asksForRecentSignIn(verb: Verb): boolean {
  return "recent" in verbs[verb];
}
