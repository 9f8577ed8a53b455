import type { Context } from "../../src/data/access/actor";
import { releaseCertificate, seenRecords } from "../../src/data/certificates";
import { recordCleaningRun } from "../../src/data/cleaning-runs";
import { getSetResults } from "../../src/data/cycles";
import { getSet } from "../../src/data/sets";
import { keyed } from "./acting";

/** A cleaning run as the lab usually does it. */
export function clean(technician: Context, setId: string, detergentBatch = "D-118") {
  return recordCleaningRun(
    technician,
    keyed({
      setId,
      bath: "Ultrasonic bath 2",
      detergentBatch,
      minutes: "30",
      temperatureC: "50",
      backFlushed: true,
      partsRenewed: ["inlet filter", "upper seal", "lower seal"],
      note: "",
    }),
  );
}

/** Releases what the manager sees now. */
export async function release(manager: Context, setId: string, remarks = "") {
  const { version } = await getSet(manager, { setId });
  const seen = seenRecords(await getSetResults(manager, { setId }));
  return releaseCertificate(manager, keyed({ setId, version, seen, paperSize: "A4", remarks }));
}
