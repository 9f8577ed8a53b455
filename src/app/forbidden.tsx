import { connection } from "next/server";
import { DeadEnd } from "@/ui/layout/dead-end";

export default async function Forbidden() {
  await connection();
  return (
    <DeadEnd title="Your role does not include this">
      The lab manager decides who may do what. Nothing was changed.
    </DeadEnd>
  );
}
