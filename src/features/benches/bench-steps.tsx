"use client";
import type { BenchStatus } from "@/data/benches";
import { clearBenchHoldInput, holdBenchInput } from "@/data/benches/inputs";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { ButtonLink } from "@/ui/layout/button-link";
import { clearBenchHoldAction, holdBenchAction } from "./actions";

type Props = {
  bench: Pick<BenchStatus, "benchId" | "code" | "state"> & { hold: { reason: string } | null };
  roles: readonly string[];
};

/** What may be done with a bench as a whole. The server decides all the same. */
export function BenchSteps({ bench: { benchId, code, state, hold }, roles }: Props) {
  const isManager = roles.includes("manager");
  return (
    <>
      {!hold && state !== "retired" ? (
        <ReasonDialog
          trigger="Put on hold"
          title={`Put bench ${code} on hold`}
          description="No cycle is recorded on it until the lab manager clears it."
          action={holdBenchAction}
          schema={holdBenchInput}
          fields={{ benchId }}
          submitLabel="Put on hold"
        />
      ) : null}
      {hold && isManager ? (
        <ReasonDialog
          trigger="Clear the hold"
          triggerKind="primary"
          title={`Clear the hold of bench ${code}`}
          description={`On hold: ${hold.reason}`}
          action={clearBenchHoldAction}
          schema={clearBenchHoldInput}
          fields={{ benchId }}
          submitLabel="Clear the hold"
          reasonLabel="Why it may be used again"
        />
      ) : null}
      {isManager ? (
        <>
          <ButtonLink href={`/calibration/${benchId}/edit`}>Edit the bench</ButtonLink>
          <ButtonLink href={`/calibration/${benchId}/record`} kind="primary">
            Record calibrations
          </ButtonLink>
        </>
      ) : null}
    </>
  );
}
