import "server-only";
import { recordDenial } from "../audit/record-denial";
import type { Actor, Context, PersonActor } from "./actor";
import { confirmWhoYouAre, forbidden, signInNeeded } from "./errors";
import { asksForRecentSignIn, type Right, rightsOf, type Verb } from "./permissions";

/** What the actor was granted: the right, and the rows it reaches. */
export type Grant = {
  right: Right;
  /** The customers whose rows may be touched; null when any may. */
  customerIds: readonly string[] | null;
};

const strongestFirst: Right[] = ["yes", "name only", "status", "own"];

export function grantedRight(actor: Actor, verb: Verb): Right | null {
  const rights = rightsOf(verb);
  const roles = actor.kind === "person" ? actor.roles : [actor.kind];
  const granted = roles.map((role) => rights[role]);
  return strongestFirst.find((right) => granted.includes(right)) ?? null;
}

/** The first step of every verb. A refusal leaves one row in the activity record. */
export async function authorize(context: Context, verb: Verb): Promise<Grant> {
  const { actor } = context;
  const right = grantedRight(actor, verb);
  if (!right) {
    await recordDenial(context, verb);
    throw actor.kind === "anonymous" ? signInNeeded() : forbidden();
  }
  if (asksForRecentSignIn(verb) && actor.kind === "person" && !actor.authenticatedRecently)
    throw confirmWhoYouAre();
  return { right, customerIds: right === "own" && actor.kind === "person" ? actor.customerIds : null };
}

/** For writes that carry a person's name; a command has none to give. */
export function requirePerson(context: Context): PersonActor {
  if (context.actor.kind !== "person") throw forbidden();
  return context.actor;
}
