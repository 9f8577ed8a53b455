import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, test } from "vitest";
import { type Lab, makeLab } from "../../seed/factories/lab";
import type { Context } from "../../src/data/access/actor";
import { isRefusal } from "../../src/data/access/errors";
import { rightsOf, type Verb, verbs } from "../../src/data/access/permissions";
import * as activity from "../../src/data/activity";
import * as benches from "../../src/data/benches";
import * as calibrations from "../../src/data/calibrations";
import * as certificates from "../../src/data/certificates";
import * as cleaningRuns from "../../src/data/cleaning-runs";
import * as customers from "../../src/data/customers";
import * as cycles from "../../src/data/cycles";
import * as fluids from "../../src/data/fluids";
import * as lab from "../../src/data/lab";
import * as models from "../../src/data/models";
import * as people from "../../src/data/people";
import * as photos from "../../src/data/photos";
import * as sets from "../../src/data/sets";
import * as toleranceClasses from "../../src/data/tolerance-classes";
import { eventsAfter, fingerprint, lastPosition } from "../support/fingerprint";

type Call = (context: Context, raw: unknown) => Promise<unknown>;

const doors = {
  ...activity,
  ...benches,
  ...calibrations,
  ...certificates,
  ...cleaningRuns,
  ...customers,
  ...cycles,
  ...fluids,
  ...lab,
  ...models,
  ...people,
  ...photos,
  ...sets,
  ...toleranceClasses,
} as unknown as Record<string, Call>;

const names = Object.keys(verbs) as Verb[];
/** What a door offers besides verbs: parts that other nouns' queries are built of. */
const parts = [
  "certificatesResting",
  "customerName",
  "insertCustomer",
  "insertModel",
  "loadCleaningRuns",
  "modelColumns",
  "modelName",
  "presentResults",
  "railStripsOfSets",
  "recordersOf",
  "releaseMeaning",
  "seenRecords",
  "setsWithin",
];

let house: Lab;
let contexts: Record<"anonymous" | "customer" | "counter" | "technician" | "manager", Context>;

beforeAll(async () => {
  house = await makeLab();
  contexts = {
    anonymous: { actor: { kind: "anonymous" }, requestId: randomUUID() },
    customer: house.customerPerson.context,
    counter: house.counter.context,
    technician: house.technician.context,
    manager: house.manager.context,
  };
});

test("every verb of the table stands in a door, and every door offers verbs of the table", () => {
  expect(names.filter((name) => typeof doors[name] !== "function")).toEqual([]);
  const unknown = Object.keys(doors).filter((name) => !(name in verbs) && !parts.includes(name));
  expect(unknown).toEqual([]);
});

const roles = ["anonymous", "customer", "counter", "technician", "manager"] as const;

describe.each(roles)("%s", (role) => {
  const refused = names.filter((name) => !rightsOf(name)[role]);
  const allowed = names.filter((name) => rightsOf(name)[role]);

  test.each(refused)("%s is refused, changes nothing and leaves one denial", async (name) => {
    const [before, position] = [await fingerprint(), await lastPosition()];
    const error = await doors[name]!(contexts[role], {}).catch((thrown: unknown) => thrown);
    expect(isRefusal(error, role === "anonymous" ? "sign-in needed" : "forbidden")).toBe(true);
    expect((await eventsAfter(position)).map(({ event }) => event)).toEqual(["denied"]);
    expect(await fingerprint()).toBe(before);
  });

  test("is not turned away from what the table grants", async () => {
    for (const name of allowed) {
      const error = await doors[name]!(contexts[role], {}).catch((thrown: unknown) => thrown);
      expect(isRefusal(error, "forbidden") || isRefusal(error, "sign-in needed"), name).toBe(false);
    }
  });
});
