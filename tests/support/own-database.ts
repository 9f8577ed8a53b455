import { afterAll } from "vitest";
import { closeDatabase } from "../../src/db/client";
import { addressOf, asOwner, ownerAddress, template } from "./databases";

// Every suite works in a copy of its own, as the application does: in the runtime role.
const maintenance = ownerAddress();
const own = `${template}_${process.pid}_${Math.random().toString(36).slice(2, 8)}`;
await asOwner((sql) => sql`create database ${sql(own)} template ${sql(template)}`, maintenance);
process.env.DATABASE_OWNER_URL = addressOf(maintenance, own);
process.env.DATABASE_URL = addressOf(process.env.DATABASE_URL!, own);

afterAll(async () => {
  await closeDatabase();
  await asOwner((sql) => sql`drop database if exists ${sql(own)} with (force)`, maintenance);
});
