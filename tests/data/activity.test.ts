import { beforeAll, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { dayFromNow, type Lab, makeLab } from "../../seed/factories/lab";
import { addWorker } from "../../seed/factories/people";
import { checkIn } from "../../seed/factories/sets";
import { signInWithPassword } from "../../src/auth/sign-in";
import { listActivity } from "../../src/data/activity";
import { holdBench } from "../../src/data/benches";
import { editLabDetails, getLabDetails } from "../../src/data/lab";
import { listPeople } from "../../src/data/people";
import { clearSetHold, holdSet } from "../../src/data/sets";
import { asOwner } from "../support/databases";
import { givePassword, nobody, password } from "../support/people";

let lab: Lab;
let setId: string;
let number: string;

beforeAll(async () => {
  lab = await makeLab();
  ({ setId, number } = await checkIn(lab.counter.context, {
    customerId: lab.customer,
    modelId: lab.modelId,
    toleranceClassId: lab.toleranceClassId,
    promisedOn: dayFromNow(5),
  }));
  await holdSet(lab.technician.context, keyed({ setId, reason: "The customer is asked." }));
  await clearSetHold(lab.counter.context, keyed({ setId, reason: "The customer agreed." }));
});

function list(asked: object = {}) {
  return listActivity(lab.manager.context, asked);
}

test("a set's events are listed newest first, with who, in which role and why", async () => {
  const { rows } = await list({ setId });
  expect(rows.map(({ event, personName, roles, reason }) => [event, personName, roles, reason])).toEqual([
    ["set hold cleared", "Ines Fallow", ["counter"], "The customer agreed."],
    ["set held", "Tomas Brandt", ["technician"], "The customer is asked."],
    ["set checked in", "Ines Fallow", ["counter"], null],
  ]);
  expect(new Set(rows.map((row) => row.setNumber))).toEqual(new Set([number]));
});

test("person, event and set narrow the list together", async () => {
  const { rows, total } = await list({ setId, personId: lab.counter.personId, event: "set checked in" });
  expect([rows.length, total]).toEqual([1, 1]);
  expect((await list({ setId, personId: lab.technician.personId, event: "set checked in" })).total).toBe(0);
});

test("who signed in did so in their own name", async () => {
  const { personId } = await addWorker("Bela Thorn", "bela.thorn@lab.example", ["technician"]);
  await givePassword(personId);
  await signInWithPassword(nobody(), {
    email: "bela.thorn@lab.example",
    password,
    peer: "10.2.0.1",
    browser: "a browser",
  });
  const { rows } = await list({ personId, event: "signed in" });
  expect(rows).toMatchObject([{ personName: "Bela Thorn", roles: ["technician"], objectName: "Bela Thorn" }]);
});

test("what was changed is called by its name of today", async () => {
  const { benchId, code } = lab.bench;
  await holdBench(lab.technician.context, keyed({ benchId, reason: "The pump knocks." }));
  const named = async (event: string) => (await list({ event })).rows[0]?.objectName;
  expect(await named("bench held")).toBe(`bench ${code}`);
  expect(await named("tolerance class added")).toMatch(/^Road race /);
  expect(await named("model added")).toMatch(/KX-440/);
  expect(await named("customer added")).toMatch(/^Sallow Ridge Racing /);
});

test("a refusal is on record with who tried", async () => {
  await listPeople(lab.technician.context).catch(() => null);
  const { rows } = await list({ personId: lab.technician.personId, event: "denied" });
  expect(rows).toHaveLength(1);
});

test("days are those of the lab's clock", async () => {
  const { testPlan, ...details } = await getLabDetails(lab.manager.context);
  await editLabDetails(
    lab.manager.context,
    keyed({ ...details, ...testPlan, timeZone: "Pacific/Kiritimati" }),
  );
  const [row] = (await list({ setId })).rows;
  const day = row!.at.toLocaleDateString("sv-SE", { timeZone: "Pacific/Kiritimati" });
  const dayAfter = new Date(Date.parse(day) + 86_400_000).toISOString().slice(0, 10);
  expect((await list({ setId, from: day, until: day })).total).toBe(3);
  expect((await list({ setId, from: dayAfter })).total).toBe(0);
});

test("pages neither repeat nor leave out a row", async () => {
  const { total } = await list();
  const seen: number[] = [];
  for (let startRow = 0; startRow < total; startRow += 7) {
    const { rows } = await list({ startRow, endRow: startRow + 7 });
    seen.push(...rows.map((row) => row.position));
  }
  expect(seen).toEqual(Array.from({ length: total }, (_, index) => total - index));
});

test("what an address asks for and nobody knows is left out", async () => {
  const { total } = await list();
  for (const odd of [{ personId: "x" }, { event: "x" }, { from: "2026-02-30" }, { startRow: "-5" }])
    expect((await list(odd)).total).toBe(total);
});

test("every entry carries the one before it: a changed row is found", async () => {
  const broken = () =>
    asOwner(
      (sql) => sql`
        select a.position::int from activity a left join activity b on b.position = a.position - 1
         where a.hash <> activity_digest(a) or a.previous_hash <> coalesce(b.hash, repeat('0', 64))`,
    );
  expect(await broken()).toEqual([]);
  const { position } = (await list({ setId })).rows[0]!;
  await asOwner((sql) =>
    sql.begin(async (transaction) => {
      await transaction`alter table activity disable trigger user`;
      await transaction`update activity set reason = 'Another reason.' where position = ${position}`;
    }),
  );
  expect(await broken()).toEqual([{ position }]);
});

test.each(["update activity set reason = 'x'", "delete from activity", "truncate activity"])(
  "the application may not %s",
  async (statement) => {
    await expect(
      asOwner(async (sql) => {
        await sql`set role evenrail_app`;
        await sql.unsafe(statement);
      }),
    ).rejects.toThrow("permission denied");
  },
);
