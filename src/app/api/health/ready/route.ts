import { sql } from "drizzle-orm";
import { database } from "@/db/client";

export const dynamic = "force-dynamic";

/** Whether work can be done: the database answers. */
export async function GET(): Promise<Response> {
  const headers = { "Cache-Control": "no-store" };
  try {
    await database().execute(sql`select 1`);
    return Response.json({ ready: true }, { headers });
  } catch {
    return Response.json({ ready: false }, { status: 503, headers: { ...headers, "Retry-After": "5" } });
  }
}
