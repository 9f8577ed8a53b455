import type {
  handOverWays,
  injectorConditions,
  injectorStates,
  Phase,
  photoKinds,
  Stage,
  workItems,
} from "../../db/vocabulary";
import type { RailStripValues } from "../cycles/results";
import type { Model } from "../models";

export type WorkItem = (typeof workItems)[number];
export type InjectorCondition = (typeof injectorConditions)[number];

/** Everything of a set but its measurements; the measurements are in SetResults. */
export type SetDetail = {
  setId: string;
  number: string;
  /** Counts the changes of intake data; a change of stage leaves it as it is. */
  version: number;
  stage: Stage;
  customer: SetCustomer;
  model: Model;
  toleranceClass: SetToleranceClass;
  workAsked: WorkItem[];
  customerRequest: string;
  /** Null for the customer's own people. */
  internalNote: string | null;
  promisedOn: string;
  /** Days past the promise while the set is worked on; 0 otherwise. */
  daysLate: number;
  checkedInAt: Date;
  checkedInBy: string;
  hold: { reason: string; heldAt: Date; heldBy: string } | null;
  /** Holds that are over, oldest first. */
  earlierHolds: EarlierHold[];
  /** By place, then in order of arrival: a replacement stands behind what it replaces. */
  injectors: SetInjector[];
  /** Oldest first. */
  course: CourseStep[];
  photos: SetPhoto[];
  handOver: HandOver | null;
};

/** Contact data are null for technicians. */
export type SetCustomer = {
  customerId: string;
  name: string;
  contactName: string | null;
  email: string | null;
  phone: string | null;
};

/** The class's latest revision: what the set would be judged by today. */
export type SetToleranceClass = {
  toleranceClassId: string;
  name: string;
  revisionId: string;
  revision: number;
  spreadLimits: { fromPulseWidthMs: number; spreadPercent: number }[];
  staticSpreadPercent: number | null;
  deadTimeRangeMs: number | null;
  resistanceRangeOhm: number | null;
  leakageLimitMm3PerMin: number | null;
};

export type SetInjector = {
  setInjectorId: string;
  injectorId: string;
  position: number;
  tag: string;
  serial: string | null;
  marking: string;
  condition: InjectorCondition;
  conditionNote: string;
  state: (typeof injectorStates)[number];
  replacesTag: string | null;
  rejection: { reason: string; at: Date; by: string } | null;
  /** Newest first. */
  earlierVisits: EarlierVisit[];
};

export type EarlierVisit = { setId: string; number: string; checkedInAt: Date };
export type EarlierHold = {
  reason: string;
  heldAt: Date;
  heldBy: string;
  clearedAt: Date;
  clearedBy: string;
  clearedReason: string;
};
export type CourseStep = { from: Stage | null; to: Stage; at: Date; by: string; reason: string | null };

export type SetPhoto = {
  photoId: string;
  /** Null when the photo shows the set as a whole. */
  setInjectorId: string | null;
  kind: (typeof photoKinds)[number];
  phase: Phase | null;
  widthPx: number;
  heightPx: number;
  takenAt: Date;
  takenBy: string;
  /** A hidden photo stays on record; only the manager can still open it. */
  hiddenReason: string | null;
};

export type HandOver = {
  takenBy: string;
  way: (typeof handOverWays)[number];
  consignment: string;
  handedOverBy: string;
  at: Date;
};

export type KnownInjector = {
  serial: string;
  injectorId: string;
  /** The number of the set it has not left yet. */
  openSet: string | null;
  /** Newest first. */
  visits: EarlierVisit[];
};

/** A set as a list shows it. */
export type SetRow = {
  setId: string;
  number: string;
  customerId: string;
  customer: string;
  model: string;
  /** Those in the set now, without rejected and replaced ones. */
  injectors: number;
  stage: Stage;
  /** The reason, while it is on hold. */
  hold: string | null;
  promisedOn: string;
  /** Days past the promise while the set is worked on; 0 otherwise. */
  daysLate: number;
  checkedInAt: Date;
  rail: RailStripValues | null;
};
