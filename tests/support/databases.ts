import postgres from "postgres";

export const template = `test_${process.env.EVENRAIL_TEST_RUN ?? process.pid}_template`;

/** The same server and role, another database. */
export function addressOf(url: string, database: string): string {
  const address = new URL(url);
  address.pathname = `/${database}`;
  return address.href;
}

export function ownerAddress(): string {
  const url = process.env.DATABASE_OWNER_URL;
  if (!url) throw new Error("DATABASE_OWNER_URL is not set: run the tests with npm test");
  return url;
}

/** Statements of the owner, outside of the application's pool. */
export async function asOwner<Result>(
  work: (sql: postgres.Sql) => Promise<Result>,
  url = ownerAddress(),
): Promise<Result> {
  const sql = postgres(url, { max: 1, onnotice: () => {} });
  try {
    return await work(sql);
  } finally {
    await sql.end();
  }
}
