import "server-only";
import { eq } from "drizzle-orm";
import { people } from "../../db/schema/people";
import type { Context } from "../access/actor";
import { notFound } from "../access/errors";
import { read } from "../read";
import { getPersonInput } from "./inputs";
import { personColumns } from "./person-columns";

export function getPerson(context: Context, raw: unknown) {
  return read(context, "getPerson", getPersonInput, raw, async ({ connection, input }) => {
    const [found] = await connection.select(personColumns).from(people).where(eq(people.id, input.personId));
    if (!found) throw notFound("person");
    return found;
  });
}
