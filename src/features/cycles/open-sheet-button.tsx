"use client";
import type { Phase } from "@/db/vocabulary";
import type { ButtonKind } from "@/ui/button-style";
import { ActionButton } from "@/ui/form/action-button";
import { openCycleCorrectionAction, openCycleDraftAction } from "./actions";

type Props = { setId: string; phase: Phase; kind?: ButtonKind; children: string };

/** Opens the sheet of a set's cycle, or the one that is open already. */
export function OpenSheetButton({ setId, phase, kind, children }: Props) {
  return (
    <ActionButton action={openCycleDraftAction} fields={{ setId, phase }} kind={kind} busyLabel="Opening">
      {children}
    </ActionButton>
  );
}

/** Opens a recorded cycle to be corrected as a new revision. */
export function CorrectCycleButton({ cycleId, children }: { cycleId: string; children: string }) {
  return (
    <ActionButton action={openCycleCorrectionAction} fields={{ cycleId }} busyLabel="Opening">
      {children}
    </ActionButton>
  );
}
