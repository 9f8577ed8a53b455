import "server-only";
import type { Transaction } from "../../db/client";
import type { Role } from "../../db/vocabulary";

export type PersonActor = {
  kind: "person";
  personId: string;
  name: string;
  roles: readonly Role[];
  /** The customers that a customer's person acts for. */
  customerIds: readonly string[];
  sessionId: string;
  /** Proved who they are within the last minutes, as release and its like ask. */
  authenticatedRecently: boolean;
};

/** A command on the lab's own machine, such as the one that makes the first manager. */
export type CommandActor = { kind: "command"; name: string };
export type AnonymousActor = { kind: "anonymous" };
export type Actor = PersonActor | CommandActor | AnonymousActor;

/** Who asks, and within which request. Made only by auth/current-actor, commands, the seed and tests. */
export type Context = {
  actor: Actor;
  requestId: string;
  /** Joins an open transaction instead of opening one. */
  transaction?: Transaction;
};

/** What a page shows or hides by; what may be done is decided in every verb again. */
export function rolesOf(actor: Actor): readonly Role[] {
  return actor.kind === "person" ? actor.roles : [];
}

export function personIdOf(actor: Actor): string {
  return actor.kind === "person" ? actor.personId : "";
}

/** How an actor stands in the records that hold no contact data. */
export function actorLabel(actor: Actor): string {
  if (actor.kind === "person") return `person ${actor.personId}`;
  return actor.kind === "command" ? `command ${actor.name}` : "anonymous";
}
