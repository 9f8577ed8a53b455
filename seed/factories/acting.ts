import { randomUUID } from "node:crypto";
import type { Context } from "../../src/data/access/actor";
import type { Role } from "../../src/db/vocabulary";

export type Acting = {
  personId: string;
  name: string;
  roles: readonly Role[];
  customerIds?: readonly string[];
};

/** The context of somebody at work who entered their password a moment ago. */
export function actingAs({ personId, name, roles, customerIds = [] }: Acting): Context {
  return {
    actor: {
      kind: "person",
      personId,
      name,
      roles,
      customerIds,
      sessionId: "none",
      authenticatedRecently: true,
    },
    requestId: randomUUID(),
  };
}

/** What sets a lab up before anybody works in it. */
export function settingUp(): Context {
  return { actor: { kind: "command", name: "set-up" }, requestId: randomUUID() };
}

/** A form's fields with a key of their own. */
export function keyed<Fields extends object>(fields: Fields) {
  return { idempotencyKey: randomUUID(), ...fields };
}
