import "server-only";

/** Both values of a field that somebody else changed meanwhile. */
export type ConflictingValue = { field: string; label: string; theirs: string; yours: string };

type Details = {
  "not found": Record<never, never>;
  "sign-in needed": Record<never, never>;
  forbidden: Record<never, never>;
  invalid: { fields: Record<string, string[]> };
  conflict: { values: ConflictingValue[] };
  refused: { missing: string[] };
  "confirm who you are": Record<never, never>;
  busy: { retryAfterSeconds: number };
};

export type RefusalKind = keyof Details;

/** The one way in which the data layer says no. `message` is for people; `cause` is for the log. */
export class Refusal<Kind extends RefusalKind = RefusalKind> extends Error {
  override readonly name = "Refusal";
  constructor(
    readonly kind: Kind,
    message: string,
    readonly details: Details[Kind],
    options?: { cause?: unknown },
  ) {
    super(message, options);
  }
}

export function isRefusal<Kind extends RefusalKind>(error: unknown, kind?: Kind): error is Refusal<Kind> {
  return error instanceof Refusal && (kind === undefined || error.kind === kind);
}

export function notFound(noun: string): Refusal<"not found"> {
  return new Refusal("not found", `There is no such ${noun}.`, {});
}

export function signInNeeded(): Refusal<"sign-in needed"> {
  return new Refusal("sign-in needed", "Please sign in.", {});
}

export function forbidden(): Refusal<"forbidden"> {
  return new Refusal("forbidden", "Your role does not allow this.", {});
}

/** One field is not as it must be; the path is as the form names it: `injectors[2].serial`. */
export function invalid(field: string, message: string): Refusal<"invalid"> {
  return new Refusal("invalid", message, { fields: { [field]: [message] } });
}

export function conflict(message: string, values: ConflictingValue[]): Refusal<"conflict"> {
  return new Refusal("conflict", message, { values });
}

/** The step is not possible now; `missing` says what must be true first. */
export function refused(message: string, missing: string[] = []): Refusal<"refused"> {
  return new Refusal("refused", message, { missing });
}

export function confirmWhoYouAre(): Refusal<"confirm who you are"> {
  return new Refusal("confirm who you are", "Please enter your password again for this step.", {});
}

export function busy(message: string, retryAfterSeconds: number, cause?: unknown): Refusal<"busy"> {
  return new Refusal("busy", message, { retryAfterSeconds }, { cause });
}
