import "server-only";

const lost = /^(CONNECTION_|CONNECT_TIMEOUT|ECONN|57P0)/;

/** The driver's and the server's codes for a connection that is gone, also when drizzle has wrapped the error. */
export function isLostConnection(error: unknown): boolean {
  return lost.test(sqlState(error) ?? "");
}

/** SQLSTATE or driver code of an error, looking through the causes that drizzle adds. */
export function sqlState(error: unknown): string | undefined {
  for (let current = error; current instanceof Error; current = current.cause) {
    const code = (current as { code?: unknown }).code;
    if (typeof code === "string") return code;
  }
  return undefined;
}

/** Name of the constraint a statement broke. */
export function brokenConstraint(error: unknown): string | undefined {
  for (let current = error; current instanceof Error; current = current.cause) {
    const name = (current as { constraint_name?: unknown }).constraint_name;
    if (typeof name === "string") return name;
  }
  return undefined;
}
