import { connection } from "next/server";
import { DeadEnd } from "@/ui/layout/dead-end";

/** Rendered for each request: a prepared page would carry no nonce. */
export default async function NotFound() {
  await connection();
  return (
    <DeadEnd title="There is nothing at this address">
      It may have been mistyped, or what was here is not yours to see.
    </DeadEnd>
  );
}
