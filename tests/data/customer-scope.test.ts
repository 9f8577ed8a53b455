import { randomUUID } from "node:crypto";
import sharp from "sharp";
import { beforeAll, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { release } from "../../seed/factories/steps";
import type { Context } from "../../src/data/access/actor";
import {
  getCertificate,
  getCertificateFile,
  getDataSheet,
  listCertificates,
  reissueCertificate,
  seenRecords,
} from "../../src/data/certificates";
import { findCustomers, getCustomer, listCustomers } from "../../src/data/customers";
import { getSetResults } from "../../src/data/cycles";
import { addPhoto, getPhotoFile, hidePhoto } from "../../src/data/photos";
import { countSets, findSet, getSet, listSets } from "../../src/data/sets";
import { refusalOf } from "../support/refusal-of";
import { setInReview } from "../support/set-in-review";

const canary = "canary 5f1c2d: ask for cash";
const everything = { view: "all", startRow: 0, endRow: 100 };

let lab: Lab;
let own: Context;
let other: Context;
let set: Awaited<ReturnType<typeof setInReview>>;
let certificateId: string;
let photoId: string;

beforeAll(async () => {
  lab = await makeLab();
  own = lab.customerPerson.context;
  other = lab.otherCustomerPerson.context;
  set = await setInReview(lab, { internalNote: canary });
  photoId = await photograph(set.setId);
  ({ certificateId } = await release(lab.manager.context, set.setId));
});

async function photograph(setId: string): Promise<string> {
  const file = await sharp({ create: { width: 60, height: 40, channels: 3, background: "#345" } })
    .png()
    .toBuffer();
  const photo = await addPhoto(
    lab.counter.context,
    keyed({ setId, kind: "intake", name: "parcel.png", file: new Uint8Array(file) }),
  );
  return photo.photoId;
}

type Look = (context: Context, id: string) => Promise<unknown>;

const looks: [string, Look, () => string][] = [
  ["a set", (context, setId) => getSet(context, { setId }), () => set.setId],
  ["its results", (context, setId) => getSetResults(context, { setId }), () => set.setId],
  ["a certificate", (context, id) => getCertificate(context, { certificateId: id }), () => certificateId],
  ["its PDF", (context, id) => getCertificateFile(context, { certificateId: id }), () => certificateId],
  [
    "its data sheet",
    (context, id) => getDataSheet(context, { certificateId: id, format: "csv" }),
    () => certificateId,
  ],
  ["a photo", (context, id) => getPhotoFile(context, { photoId: id }), () => photoId],
  ["a customer", (context, customerId) => getCustomer(context, { customerId }), () => lab.customer],
];

test.each(looks)(
  "%s is there for its customer, and for another one like an id that nothing has",
  async (...looked) => {
    const [, look, idOf] = looked;
    await look(own, idOf());
    const foreign = await refusalOf(look(other, idOf()));
    const unknown = await refusalOf(look(other, randomUUID()));
    expect(foreign.kind).toBe("not found");
    expect([foreign.kind, foreign.message, foreign.details]).toEqual([
      unknown.kind,
      unknown.message,
      unknown.details,
    ]);
  },
);

test("lists, counts and searches hold a customer's own rows, whatever is asked for", async () => {
  const asked = [
    everything,
    { ...everything, search: set.number },
    { ...everything, customerId: lab.customer },
  ];
  for (const list of asked) {
    expect((await listSets(own, list)).rows.map(({ setId }) => setId)).toContain(set.setId);
    expect(await listSets(other, list)).toEqual({ rows: [], total: 0 });
  }
  for (const list of [
    everything,
    { ...everything, setId: set.setId },
    { ...everything, search: set.number },
  ]) {
    expect((await listCertificates(own, list)).total).toBe(1);
    expect(await listCertificates(other, list)).toEqual({ rows: [], total: 0 });
  }
  expect(Object.values(await countSets(other))).toEqual([0, 0, 0, 0, 0, 0]);
  expect(await findSet(other, { typed: set.number })).toBeNull();
  expect(await findSet(other, { typed: set.injectors[0]!.tag })).toBeNull();
  const customers = await listCustomers(other, everything);
  expect(customers.rows.map(({ customerId }) => customerId)).toEqual([lab.otherCustomer]);
  expect(await findCustomers(other, { search: "Orrin" })).toEqual([]);
});

test("nothing measured is shown before it is certified, neither as a page, nor in a list, nor as a picture", async () => {
  const uncertified = await setInReview(lab);
  const { setId } = uncertified;
  expect((await getSet(own, { setId })).stage).toBe("in review");
  expect((await refusalOf(getSetResults(own, { setId }))).kind).toBe("not found");
  const rowOf = async (context: Context) =>
    (await listSets(context, { ...everything, search: uncertified.number })).rows[0];
  expect((await rowOf(lab.counter.context))?.rail?.left).toHaveLength(4);
  expect((await rowOf(own))?.rail).toBeNull();
  await release(lab.manager.context, setId);
  expect((await getSetResults(own, { setId })).asLeft).not.toBeNull();
  expect((await rowOf(own))?.rail?.left).toHaveLength(4);
});

test("an internal note and the staff's e-mail stay in the lab", async () => {
  expect((await getSet(lab.counter.context, { setId: set.setId })).internalNote).toBe(canary);
  const seen = JSON.stringify([
    await getSet(own, { setId: set.setId }),
    await getSetResults(own, { setId: set.setId }),
    await listSets(own, everything),
    await getCertificate(own, { certificateId }),
    (await getDataSheet(own, { certificateId, format: "json" })).text,
  ]);
  expect(seen).not.toContain(canary);
  expect(seen).not.toContain("@lab.example");
});

test("a hidden photo is gone for its customer and stays for the manager", async () => {
  const reviewed = await setInReview(lab);
  const hidden = await photograph(reviewed.setId);
  await hidePhoto(lab.manager.context, keyed({ photoId: hidden, reason: "It shows another parcel." }));
  expect((await refusalOf(getPhotoFile(own, { photoId: hidden }))).kind).toBe("not found");
  expect((await getSet(own, { setId: reviewed.setId })).photos).toEqual([]);
  await getPhotoFile(lab.manager.context, { photoId: hidden });
});

test("a superseded certificate stays the customer's, under its state", async () => {
  const manager = lab.manager.context;
  const { version } = await getSet(manager, { setId: set.setId });
  const seen = seenRecords(await getSetResults(manager, { setId: set.setId }));
  await reissueCertificate(
    manager,
    keyed({ certificateId, version, seen, paperSize: "Letter", remarks: "", reason: "On Letter paper." }),
  );
  expect((await getCertificateFile(own, { certificateId })).state).toBe("superseded");
  const { rows } = await listCertificates(own, { ...everything, setId: set.setId });
  expect(rows.map(({ state }) => state)).toEqual(["current", "superseded"]);
});
