import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, test } from "vitest";
import { actingAs, keyed } from "../../seed/factories/acting";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { addWorker } from "../../seed/factories/people";
import { confirmIdentity } from "../../src/auth/confirm-identity";
import { findEntryLink } from "../../src/auth/entry-link";
import { sessionIdOf } from "../../src/auth/session";
import type { Context } from "../../src/data/access/actor";
import {
  addPerson,
  changeOwnPassword,
  endOwnSignIn,
  endPersonSignIns,
  getOwnProfile,
  getPerson,
  listPeople,
  setPersonActive,
  setPersonRoles,
} from "../../src/data/people";
import { database } from "../../src/db/client";
import type { StaffRole } from "../../src/db/vocabulary";
import { asOwner } from "../support/databases";
import { eventsAfter, fingerprint, lastPosition } from "../support/fingerprint";
import { givePassword, isSignedIn, password, tokenOf } from "../support/people";
import { refusalOf } from "../support/refusal-of";

let lab: Lab;

beforeAll(async () => {
  lab = await makeLab();
});

function someone(roles: StaffRole[] = ["counter"]) {
  return addWorker("Ilse Varga", `ilse.${randomUUID()}@lab.example`, roles);
}

async function setRoles(as: Context, personId: string, roles: StaffRole[]) {
  const { version } = await getPerson(lab.manager.context, { personId });
  return setPersonRoles(as, keyed({ personId, version, roles, customerIds: [] }));
}

/** Whoever carries this token acts. */
function withToken(context: Context, token: string): Context {
  if (context.actor.kind !== "person") throw new Error("a person was expected");
  return { ...context, actor: { ...context.actor, sessionId: sessionIdOf(token) } };
}

describe("accounts", () => {
  test("two spellings of an address are one account", async () => {
    const form = { name: "Odo Lind", kind: "staff", roles: ["counter"], customerId: "" };
    await addPerson(lab.manager.context, keyed({ ...form, email: "odo.lind@lab.example" }));
    const refused = await refusalOf(
      addPerson(lab.manager.context, keyed({ ...form, email: "Odo.LIND@lab.example" })),
    );
    expect(refused.details).toEqual({ fields: { email: ["There is already an account with this e-mail."] } });
  });

  test("the same form sent twice is one account, and its link is told once", async () => {
    const form = keyed({
      name: "Wim Aster",
      email: "wim@lab.example",
      kind: "staff",
      roles: ["counter"],
      customerId: "",
    });
    const first = await addPerson(lab.manager.context, form);
    expect(first.entryLink).not.toBeNull();
    expect(await addPerson(lab.manager.context, form)).toEqual({
      personId: first.personId,
      entryLink: null,
    });
  });

  test("neither name nor address stands in the activity record", async () => {
    await addPerson(
      lab.manager.context,
      keyed({
        name: "Canary Quince",
        email: "canary@lab.example",
        kind: "staff",
        roles: ["counter"],
        customerId: "",
      }),
    );
    const record = await asOwner((sql) => sql`select * from activity`);
    expect(JSON.stringify(record).toLowerCase()).not.toContain("canary");
  });

  test("staff have a role and customers' people a customer", async () => {
    const form = { name: "Odo Lind", email: "odo@works.example", roles: [], customerId: "" };
    for (const [kind, field] of [
      ["staff", "roles"],
      ["customer", "customerId"],
    ] as const) {
      const { details } = await refusalOf(addPerson(lab.manager.context, keyed({ ...form, kind })));
      expect(Object.keys((details as { fields: object }).fields)).toEqual([field]);
    }
  });

  test("a search takes %, _ and \\ as they are", async () => {
    for (const search of ["%", "_", "\\", "Nobody is called so"])
      expect((await listPeople(lab.manager.context, { search })).total).toBe(0);
    expect((await listPeople(lab.manager.context, { search: "MARA" })).total).toBeGreaterThan(0);
  });
});

describe("duties", () => {
  test("nobody sets their own roles or disables themselves", async () => {
    const { personId, context } = lab.manager;
    expect((await refusalOf(setRoles(context, personId, ["manager", "technician"]))).message).toBe(
      "Nobody sets their own roles.",
    );
    expect((await refusalOf(setPersonActive(context, keyed({ personId, active: false })))).message).toBe(
      "Nobody disables their own account.",
    );
  });

  test("roles are signed: without a password entered lately nothing changes", async () => {
    const { personId } = await someone();
    const { actor } = lab.manager.context;
    if (actor.kind !== "person") throw new Error("a person was expected");
    const stale = { ...lab.manager.context, actor: { ...actor, authenticatedRecently: false } };
    const before = await fingerprint();
    expect((await refusalOf(setRoles(stale, personId, ["manager"]))).kind).toBe("confirm who you are");
    expect(await fingerprint()).toBe(before);
  });

  test("of two managers at once the second sees what the first has set", async () => {
    const { personId } = await someone();
    const form = { personId, version: 1, customerIds: [] };
    await setPersonRoles(lab.manager.context, keyed({ ...form, roles: ["technician"] }));
    const refused = await refusalOf(
      setPersonRoles(lab.manager.context, keyed({ ...form, roles: ["counter", "manager"] })),
    );
    expect(refused.details).toMatchObject({
      values: [
        { field: "roles", theirs: "technician", yours: "counter, manager" },
        { field: "version", theirs: "2", yours: "1" },
      ],
    });
  });

  test("two managers who demote each other at once leave one of them", async () => {
    const one = await someone(["manager"]);
    const other = await someone(["manager"]);
    await asOwner(
      (sql) => sql`delete from person_roles where role = 'manager'
        and person_id not in (${one.personId}, ${other.personId})`,
    );
    const demote = (as: Context, personId: string) =>
      setPersonRoles(as, keyed({ personId, version: 1, roles: ["counter"], customerIds: [] }));
    const outcomes = await Promise.allSettled([
      demote(one.context, other.personId),
      demote(other.context, one.personId),
    ]);
    expect(outcomes.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
    const lost = outcomes.find((outcome) => outcome.status === "rejected");
    expect(lost?.reason.message).toBe("The lab would be left without a manager.");
    await asOwner(
      (sql) => sql`insert into person_roles (person_id, role) values (${lab.manager.personId}, 'manager')`,
    );
  });

  test("who is disabled is out at once: sign-ins and link end", async () => {
    const { personId, entryLink } = await addPerson(
      lab.manager.context,
      keyed({
        name: "Jon Reed",
        email: "jon@lab.example",
        kind: "staff",
        roles: ["counter"],
        customerId: "",
      }),
    );
    const token = await tokenOf(personId);
    await setPersonActive(lab.manager.context, keyed({ personId, active: false }));
    expect(await isSignedIn(token)).toBe(false);
    expect(await findEntryLink(database(), entryLink!.split("/").at(-1)!)).toBeNull();
    await setPersonActive(lab.manager.context, keyed({ personId, active: true }));
    expect(await isSignedIn(token)).toBe(false);
  });

  test("the manager ends anybody's sign-ins", async () => {
    const { personId } = await someone();
    const tokens = [await tokenOf(personId), await tokenOf(personId)];
    await endPersonSignIns(lab.manager.context, keyed({ personId }));
    for (const token of tokens) expect(await isSignedIn(token)).toBe(false);
  });
});

describe("one's own", () => {
  test("a new password needs the old one, and ends every other sign-in", async () => {
    const { personId, context } = await someone();
    await givePassword(personId);
    const [here, there] = [await tokenOf(personId), await tokenOf(personId)];
    const own = withToken(context, here);
    const newPassword = "a slow barge on the canal";
    const position = await lastPosition();
    const refused = await refusalOf(changeOwnPassword(own, { oldPassword: "wrong", newPassword }));
    expect(refused.details).toEqual({ fields: { oldPassword: ["This is not your password."] } });
    await changeOwnPassword(own, { oldPassword: password, newPassword, idempotencyKey: randomUUID() });
    expect([await isSignedIn(here), await isSignedIn(there)]).toEqual([true, false]);
    expect((await eventsAfter(position)).map(({ event }) => event)).toEqual([
      "sign-in failed",
      "password set",
    ]);
  });

  test("guessing the old password is throttled as at the door", async () => {
    const { personId, context } = await someone();
    await givePassword(personId);
    const tried = { oldPassword: "wrong", newPassword: "a slow barge on the canal" };
    for (let wrong = 0; wrong < 10; wrong++)
      expect((await refusalOf(changeOwnPassword(context, tried, `peer ${wrong}`))).kind).toBe("invalid");
    expect((await refusalOf(changeOwnPassword(context, { ...tried, oldPassword: password }))).kind).toBe(
      "busy",
    );
  });

  test("the profile lists one's own sign-ins alone, and ends one of them", async () => {
    const { personId, context } = await someone();
    const [here, there] = [await tokenOf(personId), await tokenOf(personId)];
    await tokenOf(lab.counter.personId);
    const own = withToken(context, here);
    const { signIns } = await getOwnProfile(own);
    expect(signIns.map(({ isThisOne }) => isThisOne).sort()).toEqual([false, true]);
    const other = signIns.find(({ isThisOne }) => !isThisOne)!;
    const stranger = actingAs({ personId: lab.counter.personId, name: "Ines Fallow", roles: ["counter"] });
    expect((await refusalOf(endOwnSignIn(stranger, keyed({ signInId: other.signInId })))).kind).toBe(
      "not found",
    );
    await endOwnSignIn(own, keyed({ signInId: other.signInId }));
    expect([await isSignedIn(here), await isSignedIn(there)]).toEqual([true, false]);
  });

  test("the password once more makes a sign-in recent again", async () => {
    const { personId, context } = await someone();
    await givePassword(personId);
    const own = withToken(context, await tokenOf(personId));
    await asOwner(
      (sql) => sql`update sessions set authenticated_at = now() - interval '1 hour'
        where person_id = ${personId}`,
    );
    expect(await confirmIdentity(own, "wrong", "peer")).toBe("wrong");
    expect(await confirmIdentity(own, password, "peer")).toBe("confirmed");
    const [row] = await asOwner(
      (sql) => sql`select authenticated_at > now() - interval '1 minute' as recent
        from sessions where person_id = ${personId}`,
    );
    expect(row).toEqual({ recent: true });
  });
});
