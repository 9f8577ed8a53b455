import type { SubmissionResult } from "@conform-to/dom";

/** Both values of a field that somebody else changed meanwhile. */
export type ConflictingValue = { field: string; label: string; theirs: string; yours: string };

/** What an action answers: the errors of fields, or a refusal as a value, so that what was typed stays typed. */
export type FormReply = SubmissionResult<string[]> & {
  /** An entry for the field `version` carries the version that theirs has. */
  conflict?: ConflictingValue[];
  /** The person must enter the password again; the form then sends itself once more. */
  confirmWhoYouAre?: boolean;
  /** A sentence for the page when the form stays where it is. */
  done?: string;
};

export type FormAction = (previous: FormReply | undefined, data: FormData) => Promise<FormReply>;
