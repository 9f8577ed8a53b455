import { closeDatabase, database } from "../src/db/client";
import { people } from "../src/db/schema/people";
import { playDemo } from "./demo/play";
import { openRecordClock } from "./record-clock";

/** Builds the demo in a migrated database that nobody has worked in yet. */
const url = process.env.DATABASE_OWNER_URL;
if (!url) throw new Error("DATABASE_OWNER_URL is not set: the owner's address of the database to fill");
const someone = await database().select({ id: people.id }).from(people).limit(1);
if (someone.length > 0)
  throw new Error("The database has people already: the demo is only made in an empty one");
const clock = openRecordClock(url);
try {
  await playDemo(clock, (line) => console.log(line));
} finally {
  await clock.end();
  await closeDatabase();
}
