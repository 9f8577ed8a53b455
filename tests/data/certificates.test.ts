import { createHash, randomUUID } from "node:crypto";
import { beforeAll, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { release } from "../../seed/factories/steps";
import type { Context } from "../../src/data/access/actor";
import { revokeCalibration } from "../../src/data/calibrations";
import {
  getCertificate,
  getCertificateFile,
  listCertificates,
  reissueCertificate,
  releaseCertificate,
  revokeCertificate,
  seenRecords,
  sendBackSet,
} from "../../src/data/certificates";
import { correctCleaningRun } from "../../src/data/cleaning-runs";
import { getSetResults, sendToReview } from "../../src/data/cycles";
import { getSet, handOverSet, holdSet } from "../../src/data/sets";
import { fingerprintContent } from "../../src/documents/certificate/fingerprint";
import { asOwner } from "../support/databases";
import { eventsAfter, fingerprint, lastPosition } from "../support/fingerprint";
import { missingOf, refusalOf } from "../support/refusal-of";
import { setInReview } from "../support/set-in-review";

let lab: Lab;
let manager: Context;

beforeAll(async () => {
  lab = await makeLab();
  manager = lab.manager.context;
});

/** What the page of a set puts into its forms. */
async function asSeen(setId: string) {
  const { version } = await getSet(manager, { setId });
  return { version, seen: seenRecords(await getSetResults(manager, { setId })) };
}

async function released() {
  const { setId } = await setInReview(lab);
  return release(manager, setId);
}

async function reissue(certificateId: string, setId: string, reason = "The customer's name was misspelt.") {
  const form = { certificateId, reason, paperSize: "A4", remarks: "", ...(await asSeen(setId)) };
  return reissueCertificate(manager, keyed(form));
}

test("a release stores content and PDF once, each with its hash, and says so in one event", async () => {
  const { setId } = await setInReview(lab);
  const position = await lastPosition();
  const { certificateId, number } = await release(manager, setId, "Handled with care.");
  const { bytes, sha256 } = await getCertificateFile(manager, { certificateId });
  const certificate = await getCertificate(manager, { certificateId });
  expect(createHash("sha256").update(bytes).digest("hex")).toBe(sha256);
  expect(certificate).toMatchObject({ number, state: "current", pdfSha256: sha256, pdfBytes: bytes.length });
  expect(fingerprintContent(certificate.content)).toBe(certificate.contentSha256);
  expect(certificate.content.remarks).toBe("Handled with care.");
  expect(certificate.verificationCode).toMatch(/^([0-9A-HJKMNP-TV-Z]{4}-){3}[0-9A-HJKMNP-TV-Z]{4}$/);
  expect(await eventsAfter(position)).toEqual([
    { event: "certificate released", after: { stage: "certified", number, pdfSha256: sha256 } },
  ]);
  const again = await getCertificateFile(lab.customerPerson.context, { certificateId });
  expect(Buffer.compare(again.bytes, bytes)).toBe(0);
});

test("the same release sent twice is one certificate", async () => {
  const { setId } = await setInReview(lab);
  const form = keyed({ setId, paperSize: "A4", remarks: "", ...(await asSeen(setId)) });
  const [one, other] = [await releaseCertificate(manager, form), await releaseCertificate(manager, form)];
  expect(other).toEqual(one);
  expect((await listCertificates(manager, { setId, startRow: 0, endRow: 10 })).total).toBe(1);
});

test("two releases at the same moment are one certificate, and the other is told", async () => {
  const { setId } = await setInReview(lab);
  const seen = await asSeen(setId);
  const attempt = () => releaseCertificate(manager, keyed({ setId, paperSize: "A4", remarks: "", ...seen }));
  const answers = await Promise.allSettled([attempt(), attempt()]);
  expect(answers.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
  const lost = answers.find((answer) => answer.status === "rejected")!;
  expect((await refusalOf(Promise.reject(lost.reason))).message).toContain("is certified, not in review");
});

test("nothing is released on hold or after it was sent back", async () => {
  const { setId } = await setInReview(lab);
  const seen = await asSeen(setId);
  await sendBackSet(manager, keyed({ setId, reason: "Measure the third again.", ...seen }));
  expect((await refusalOf(release(manager, setId))).message).toContain("is as left, not in review");
  expect((await getSet(manager, { setId })).course.at(-1)).toMatchObject({
    to: "as left",
    reason: "Measure the third again.",
  });
  await sendToReview(lab.technician.context, keyed({ setId }));
  await holdSet(manager, keyed({ setId, reason: "The customer is asked." }));
  const before = await fingerprint();
  expect((await refusalOf(release(manager, setId))).message).toContain("is on hold");
  expect(await fingerprint()).toBe(before);
});

test("a release asks for a password that was entered lately, and changes nothing without it", async () => {
  const { setId } = await setInReview(lab);
  if (manager.actor.kind !== "person") throw new Error("A person was expected");
  const longAgo = { ...manager, actor: { ...manager.actor, authenticatedRecently: false } };
  const before = await fingerprint();
  expect((await refusalOf(release(longAgo, setId))).kind).toBe("confirm who you are");
  expect(await fingerprint()).toBe(before);
  await release(manager, setId);
});

test("what was corrected or changed after the look is named, and nothing is approved unseen", async () => {
  const { setId } = await setInReview(lab);
  const { version, seen } = await asSeen(setId);
  const { cleaningRuns } = await getSetResults(manager, { setId });
  const { cleaningRunId, bath, minutes, temperatureC } = cleaningRuns[0]!;
  const corrected = { bath, minutes, temperatureC, detergentBatch: "D-119", partsRenewed: [], note: "" };
  await correctCleaningRun(
    lab.technician.context,
    keyed({ ...corrected, cleaningRunId, reason: "The batch was misread." }),
  );
  const stale = keyed({ setId, version: version + 1, seen, paperSize: "A4", remarks: "" });
  expect(missingOf(await refusalOf(releaseCertificate(manager, stale)))).toEqual([
    "A cleaning run was recorded or corrected.",
    "The set's intake data were changed.",
  ]);
  const { certificateId } = await release(manager, setId);
  const { content } = await getCertificate(manager, { certificateId });
  expect(content.cleaningRuns.map(({ detergentBatch }) => detergentBatch)).toEqual(["D-119"]);
});

test("a calibration that was revoked meanwhile stops the release and names the instrument", async () => {
  const own = await makeLab();
  const { setId } = await setInReview(own);
  const { asLeft } = await getSetResults(own.manager.context, { setId });
  const used = asLeft!.latest.calibrations.find(({ kind }) => kind === "pressure gauge")!;
  const reason = "The sheet is of another gauge.";
  await revokeCalibration(own.manager.context, keyed({ calibrationId: used.calibrationId, reason }));
  const before = await fingerprint();
  const refused = await refusalOf(release(own.manager.context, setId));
  expect(refused.message).toBe("A calibration that these results rest on is no longer in force.");
  expect(missingOf(refused)).toEqual([`${used.instrumentCode}, ${used.reference}: revoked: ${reason}`]);
  expect(await fingerprint()).toBe(before);
});

test("a calibration that is revoked after the release names the certificates that rest on it", async () => {
  const own = await makeLab();
  const { setId } = await setInReview(own);
  const { number } = await release(own.manager.context, setId);
  const { asFound } = await getSetResults(own.manager.context, { setId });
  const { calibrationId } = asFound!.latest.calibrations[0]!;
  const { certificates } = await revokeCalibration(
    own.manager.context,
    keyed({ calibrationId, reason: "The weights were wrong." }),
  );
  expect(certificates.map((certificate) => certificate.number)).toEqual([number]);
});

test("one person who tests and releases is refused unless the lab allows it, and then the certificate says so", async () => {
  const { setId } = await setInReview(lab);
  const { personId } = lab.technician;
  await asOwner((sql) => sql`insert into person_roles (person_id, role) values (${personId}, 'manager')`);
  const { actor } = lab.technician.context;
  if (actor.kind !== "person") throw new Error("A person was expected");
  const both: Context = {
    requestId: randomUUID(),
    actor: { ...actor, roles: ["technician", "manager"] },
  };
  expect(missingOf(await refusalOf(release(both, setId)))).toEqual([
    "Recorded by you: as found, as left, cleaning",
  ]);
  await asOwner((sql) => sql`update lab_details set releaser_is_another = false`);
  const { certificateId } = await release(both, setId);
  await asOwner((sql) => sql`update lab_details set releaser_is_another = true`);
  const { content } = await getCertificate(manager, { certificateId });
  expect(content.onePersonTestedAndReleased).toBe(true);
});

test("a reissue names the revision it replaces, which becomes superseded and keeps its file", async () => {
  const { setId, certificateId, number } = await released();
  const first = await getCertificateFile(manager, { certificateId });
  const second = await reissue(certificateId, setId);
  expect(second.number).toBe(number.replace(/\/1$/, "/2"));
  const replaced = await getCertificate(manager, { certificateId });
  expect(replaced).toMatchObject({
    state: "superseded",
    stateBy: "Mara Quill",
    stateReason: `Replaced by ${second.number}: The customer's name was misspelt.`,
  });
  const { content, revisions } = await getCertificate(manager, { certificateId: second.certificateId });
  expect(content.certificate.replaces).toEqual({ number, reason: "The customer's name was misspelt." });
  expect(revisions.map(({ state }) => state)).toEqual(["superseded", "current"]);
  const kept = await getCertificateFile(manager, { certificateId });
  expect(Buffer.compare(kept.bytes, first.bytes)).toBe(0);
  const late = await refusalOf(reissue(certificateId, setId));
  expect(late.message).toBe(`${second.number} has already taken its place.`);
});

test("a revoked certificate says by whom and why, keeps the set in the house, and can be reissued", async () => {
  const { setId, certificateId, number } = await released();
  const reason = "The wrong class was judged.";
  await revokeCertificate(manager, keyed({ certificateId, reason }));
  expect(await getCertificate(lab.customerPerson.context, { certificateId })).toMatchObject({
    state: "revoked",
    stateBy: "Mara Quill",
    stateReason: reason,
  });
  const twice = await refusalOf(revokeCertificate(manager, keyed({ certificateId, reason })));
  expect(twice.message).toBe(`${number} is already revoked.`);
  const handOver = () =>
    handOverSet(
      lab.counter.context,
      keyed({ setId, takenBy: "Orrin Hale", way: "collected", consignment: "" }),
    );
  expect(missingOf(await refusalOf(handOver()))).toEqual([
    "Its certificate was revoked: reissue it before the set is handed over.",
  ]);
  const second = await reissue(certificateId, setId, "Judged by the right class.");
  await handOver();
  const { revisions } = await getCertificate(manager, { certificateId: second.certificateId });
  expect(revisions.map(({ state }) => state)).toEqual(["revoked", "current"]);
});

test.each([
  ["what it says", "update certificates set content = '{}'"],
  ["its number", "update certificates set number = 'C00-0000/1'"],
  ["its file", "update blobs set bytes = ''"],
  ["that it exists", "delete from certificates"],
])("the application itself cannot change %s", async (_what, statement) => {
  await released();
  await expect(asOwner((sql) => sql.unsafe(statement), process.env.DATABASE_URL)).rejects.toThrow(
    /permission denied/,
  );
});
