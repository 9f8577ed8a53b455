import type { SubmissionResult } from "@conform-to/dom";
import type { ConflictingValue } from "../access/errors";

/** What a form gets back: field errors, or a refusal as a value, so that what was typed stays typed. */
export type FormReply = SubmissionResult<string[]> & {
  conflict?: ConflictingValue[];
  /** The person must enter the password again; the form asks and sends itself once more. */
  confirmWhoYouAre?: boolean;
  /** A sentence for the page when the form stays where it is. */
  done?: string;
};
