/** Every kind of event the activity record knows. Closed: a new verb brings its event here. */
export const events = [
  "denied",
  "signed in",
  "sign-in failed",
  "signed out",
  "sign-in ended",
  "password set",
  "identity confirmed",
  "person added",
  "person disabled",
  "person enabled",
  "roles set",
  "entry link made",
  "customer added",
  "customer changed",
  "model added",
  "model changed",
  "models imported",
  "tolerance class added",
  "tolerance class revised",
  "tolerance class retired",
  "tolerance class reinstated",
  "lab details changed",
  "fluid added",
  "fluid retired",
  "fluid reinstated",
  "bench added",
  "bench changed",
  "instrument changed",
  "instrument placed",
  "bench held",
  "bench hold cleared",
  "calibrations recorded",
  "calibration corrected",
  "calibration revoked",
  "set checked in",
  "intake changed",
  "set held",
  "set hold cleared",
  "set returned uncleaned",
  "set handed over",
  "draft opened",
  "draft saved",
  "draft put away",
  "cycle recorded",
  "cycle corrected",
  "cleaning run recorded",
  "cleaning run corrected",
  "injector rejected",
  "injector replaced",
  "photo added",
  "photo hidden",
  "reading file added",
  "set sent to review",
  "set sent back",
  "certificate released",
  "certificate reissued",
  "certificate revoked",
] as const;

export type EventKind = (typeof events)[number];

/** What a verb reports of its change; who, when and within which request are added by the record. */
export type Happening = {
  event: EventKind;
  noun: string;
  objectId?: string;
  setId?: string;
  before?: unknown;
  after?: unknown;
  reason?: string;
};
