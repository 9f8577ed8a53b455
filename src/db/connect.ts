import "server-only";
import postgres from "postgres";
import { isLostConnection } from "./lost-connection";

/**
 * A pool whose slots survive a dying server: postgres.js writes ROLLBACK to the closed socket when a
 * transaction's callback rejects, and that slot never works again. So the callback never rejects for a lost
 * connection; the outer promise still does, through the driver's own close handler.
 */
export function connect(url: string, max: number): postgres.Sql {
  const sql = postgres(url, {
    max,
    connect_timeout: 3,
    idle_timeout: 60,
    onnotice: () => {},
    connection: {
      application_name: "evenrail",
      timezone: "UTC",
      statement_timeout: 15_000,
      lock_timeout: 5_000,
      idle_in_transaction_session_timeout: 15_000,
    },
  });
  const begin = sql.begin.bind(sql) as (...parts: unknown[]) => Promise<unknown>;
  const guarded = (...parts: unknown[]) => {
    const work = parts.pop() as (transaction: unknown) => Promise<unknown>;
    return begin(...parts, async (transaction: unknown) => {
      try {
        return await work(transaction);
      } catch (error) {
        if (isLostConnection(error)) return new Promise(() => {});
        throw error;
      }
    });
  };
  return Object.assign(sql, { begin: guarded as typeof sql.begin });
}
