import "server-only";
import { and, desc, eq, type SQL, sql } from "drizzle-orm";
import { injectors, setInjectors } from "../../db/schema/injectors";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { read } from "../read";
import { findSetInput } from "./inputs";
import { setsWithin } from "./internal";

/** What was scanned or typed at the counter: a label's code, a tag, a set's number or a serial leads to its latest set. */
export function findSet(context: Context, raw: unknown): Promise<{ setId: string; number: string } | null> {
  return read(context, "findSet", findSetInput, raw, async ({ connection, input, grant }) => {
    const { typed } = input;
    const [found] = await connection
      .select({ setId: sets.id, number: sets.number })
      .from(sets)
      .where(and(meantBy(typed), setsWithin(grant)))
      .orderBy(desc(sql`${sets.number} = ${numberIn(typed) ?? ""}`), desc(sets.checkedInAt))
      .limit(1);
    return found ?? null;
  });
}

const addressOfSet = /\/sets\/([0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12})\/?$/i;
const numberOrTag = /^(\d{2})\s*-?\s*(\d{1,4})(?:\/\d{1,2}[a-z]?)?$/i;

function meantBy(typed: string): SQL {
  const address = addressOfSet.exec(typed);
  if (address) return eq(sets.id, address[1]!.toLowerCase());
  const bySerial = sql`${sets.id} in (
    select ${setInjectors.setId} from ${setInjectors}
    join ${injectors} on ${injectors.id} = ${setInjectors.injectorId}
    where lower(${injectors.serial}) = lower(${typed}))`;
  const number = numberIn(typed);
  return number ? sql`(${sets.number} = ${number} or ${bySerial})` : bySerial;
}

/** 26-0147, also when it is spoken as 26-147, typed as 260147 or part of a tag. */
function numberIn(typed: string): string | null {
  const spoken = numberOrTag.exec(typed);
  return spoken ? `${spoken[1]}-${spoken[2]!.padStart(4, "0")}` : null;
}
