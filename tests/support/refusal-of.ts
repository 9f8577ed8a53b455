import { isRefusal, type Refusal } from "../../src/data/access/errors";

/** How a piece of work is refused; anything else that happens fails the test. */
export async function refusalOf(work: Promise<unknown>): Promise<Refusal> {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!isRefusal(error)) throw error ?? new Error("It was not refused");
  return error;
}

export function missingOf({ details }: Refusal): string[] {
  return "missing" in details ? details.missing : [];
}
