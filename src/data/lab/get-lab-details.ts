import "server-only";
import { labDetails } from "../../db/schema/lab";
import type { Context } from "../access/actor";
import { noInput } from "../fields";
import { read } from "../read";
import { labColumns } from "./internal";

export type LabDetails = Awaited<ReturnType<typeof getLabDetails>>;

export function getLabDetails(context: Context, raw?: unknown) {
  return read(context, "getLabDetails", noInput, raw, async ({ connection }) => {
    const [lab] = await connection.select(labColumns).from(labDetails);
    return lab!;
  });
}
