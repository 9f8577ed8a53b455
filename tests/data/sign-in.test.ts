import { beforeAll, describe, expect, test } from "vitest";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { addWorker } from "../../seed/factories/people";
import { lucia, sessionIdOf } from "../../src/auth/session";
import { signInWithPassword } from "../../src/auth/sign-in";
import { signOut } from "../../src/auth/sign-out";
import { asOwner } from "../support/databases";
import { eventsAfter, lastPosition } from "../support/fingerprint";
import { givePassword, isSignedIn, nobody, password, tokenOf } from "../support/people";

let lab: Lab;
let count = 0;

beforeAll(async () => {
  lab = await makeLab();
});

/** Somebody of the lab with a password, and a network of their own. */
async function somebody() {
  count += 1;
  const email = `Somebody.${count}@lab.example`;
  const { personId } = await addWorker("Runa Holt", email, ["counter"]);
  await givePassword(personId);
  return { personId, email, peer: `10.0.0.${count}` };
}

function signIn(asked: { email: string; peer: string; password?: string }) {
  return signInWithPassword(nobody(), { password, browser: "a browser", ...asked });
}

function ageSession(token: string, { created, idle }: { created?: string; idle?: string }) {
  return asOwner(
    (sql) => sql`update sessions set created_at = created_at - ${created ?? "0"}::interval,
      expires_at = expires_at - ${idle ?? "0"}::interval where session_id = ${sessionIdOf(token)}`,
  );
}

describe("at the door", () => {
  test("the right password opens, however the address is spelled", async () => {
    const { email, peer, personId } = await somebody();
    const answer = await signIn({ email: ` ${email.toUpperCase()} `, peer });
    if (!("cookie" in answer)) throw new Error("a cookie was expected");
    const { session, user } = await lucia().validateSession(sessionIdOf(answer.cookie.value));
    expect([user?.id, session?.userId]).toEqual([personId, personId]);
  });

  test("the cookie is for this host and for no script, and the database keeps a hash of it alone", async () => {
    const answer = await signIn(await somebody());
    if (!("cookie" in answer)) throw new Error("a cookie was expected");
    const { name, value, attributes } = answer.cookie;
    expect(name).toMatch(/^__Host-/);
    expect(attributes).toMatchObject({ secure: true, httpOnly: true, sameSite: "lax", path: "/" });
    const stored = await asOwner((sql) => sql<{ id: string }[]>`select session_id as id from sessions`);
    expect(stored.map(({ id }) => id)).not.toContain(value);
    for (const { id } of stored) expect(await isSignedIn(id)).toBe(false);
  });

  test("wrong password, unknown, disabled and not yet set up are answered alike, and each is on record", async () => {
    const { email, peer } = await somebody();
    const disabled = await somebody();
    await asOwner((sql) => sql`update people set active = false where person_id = ${disabled.personId}`);
    await addWorker("Tilo Marsh", "not.yet@lab.example", ["counter"]);
    const position = await lastPosition();
    for (const tried of [
      { email, peer, password: `${password}!` },
      { email: "nobody@lab.example", peer },
      { email: disabled.email, peer },
      { email: "not.yet@lab.example", peer },
    ])
      expect(await signIn(tried)).toEqual({ wrong: true });
    expect((await eventsAfter(position)).map(({ event }) => event)).toEqual(Array(4).fill("sign-in failed"));
  });

  test("passwords are told apart beyond their 72nd byte", async () => {
    const { personId, email, peer } = await somebody();
    const long = "quiet orchard under seven hills ".repeat(3);
    await givePassword(personId, `${long}one`);
    expect(await signIn({ email, peer, password: `${long}two` })).toEqual({ wrong: true });
    expect(await signIn({ email, peer, password: `${long}one` })).toHaveProperty("cookie");
  });
});

describe("guessing", () => {
  test("after ten wrong tries an account waits, also for the right password; then it opens", async () => {
    const { email, peer } = await somebody();
    for (let wrong = 0; wrong < 10; wrong++)
      expect(await signIn({ email, peer: `${peer}:${wrong}`, password: "wrong" })).toEqual({ wrong: true });
    const answer = await signIn({ email, peer });
    if (!("waitSeconds" in answer)) throw new Error("a wait was expected");
    expect(answer.waitSeconds).toBeGreaterThan(14 * 60);
    expect(answer.waitSeconds).toBeLessThanOrEqual(15 * 60);
    expect(await signIn(await somebody())).toHaveProperty("cookie");
    await asOwner(
      (sql) =>
        sql`update throttle_counters set window_started_at = window_started_at - interval '15 minutes'`,
    );
    expect(await signIn({ email, peer })).toHaveProperty("cookie");
  });

  test("one password over forty accounts is stopped before the fortieth", async () => {
    const answers = [];
    for (let index = 0; index < 40; index++)
      answers.push(await signIn({ email: `account.${index}@lab.example`, peer: "10.9.9.9" }));
    expect(answers.filter((answer) => "wrong" in answer)).toHaveLength(30);
    expect(answers.at(-1)).toHaveProperty("waitSeconds");
  });
});

describe("a sign-in ends", () => {
  test("for staff after an hour without use", async () => {
    const token = await tokenOf(lab.counter.personId);
    await ageSession(token, { idle: "59 minutes" });
    expect(await isSignedIn(token)).toBe(true);
    await ageSession(token, { idle: "61 minutes" });
    expect(await isSignedIn(token)).toBe(false);
  });

  test("for staff twelve hours after it began, however much it is used", async () => {
    const token = await tokenOf(lab.counter.personId);
    await ageSession(token, { created: "11 hours 59 minutes" });
    expect(await isSignedIn(token)).toBe(true);
    await ageSession(token, { created: "2 minutes" });
    expect(await isSignedIn(token)).toBe(false);
  });

  test("for customers after a day without use, or seven days", async () => {
    const { personId } = lab.customerPerson;
    const [idle, old] = [await tokenOf(personId), await tokenOf(personId)];
    await ageSession(idle, { created: "13 hours", idle: "23 hours" });
    await ageSession(old, { created: "6 days 23 hours" });
    expect([await isSignedIn(idle), await isSignedIn(old)]).toEqual([true, true]);
    await ageSession(idle, { idle: "25 hours" });
    await ageSession(old, { created: "2 hours" });
    expect([await isSignedIn(idle), await isSignedIn(old)]).toEqual([false, false]);
  });

  test("with signing out, in this browser only", async () => {
    const { personId, context } = lab.technician;
    const [here, there] = [await tokenOf(personId), await tokenOf(personId)];
    if (context.actor.kind !== "person") throw new Error("a person was expected");
    await signOut({ ...context, actor: { ...context.actor, sessionId: sessionIdOf(here) } });
    expect([await isSignedIn(here), await isSignedIn(there)]).toEqual([false, true]);
  });
});
