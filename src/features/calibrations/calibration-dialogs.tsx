"use client";
import type { InstrumentCalibration } from "@/data/benches";
import { correctCalibrationInput, revokeCalibrationInput } from "@/data/calibrations/inputs";
import { DateInput } from "@/ui/form/date-input";
import { NumberInput } from "@/ui/form/number-input";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { TextInput } from "@/ui/form/text-input";
import { correctCalibrationAction, revokeCalibrationAction } from "./actions";

/** A mistyped calibration is corrected by a new entry; the one before stays readable. */
export function CorrectCalibrationDialog({
  calibration,
  validUntil,
}: {
  calibration: InstrumentCalibration;
  validUntil: string;
}) {
  const { calibrationId, reference, gain, offset, gainU, offsetU, note } = calibration;
  return (
    <ReasonDialog
      trigger="Correct"
      triggerKind="quiet"
      triggerSize="small"
      title={`Correct calibration ${reference}`}
      description="A new entry takes its place from the start of its period. Certificates that rest on the old one are not changed by it."
      action={correctCalibrationAction}
      schema={correctCalibrationInput}
      fields={{ calibrationId }}
      submitLabel="Record the correction"
      submitKind="primary"
    >
      <TextInput name="reference" label="Reference" defaultValue={reference} maxLength={80} />
      <div className="grid grid-cols-2 gap-x-4">
        <NumberInput name="gain" label="Gain" defaultValue={String(gain)} />
        <NumberInput name="gainU" label="u(gain)" defaultValue={String(gainU)} />
        <NumberInput name="offset" label="Offset" defaultValue={String(offset)} />
        <NumberInput name="offsetU" label="u(offset)" defaultValue={String(offsetU)} />
      </div>
      <DateInput name="validUntil" label="Valid until" defaultValue={validUntil} />
      <TextInput name="note" label="Note" optional defaultValue={note} maxLength={1000} />
    </ReasonDialog>
  );
}

export function RevokeCalibrationDialog({ calibration }: { calibration: InstrumentCalibration }) {
  const { calibrationId, reference, certificates } = calibration;
  const touched =
    certificates.length === 0
      ? "No certificate rests on it."
      : `${certificates.length} of the certificates rest on it: look at each of them afterwards.`;
  return (
    <ReasonDialog
      trigger="Revoke"
      triggerKind="quiet"
      triggerSize="small"
      title={`Revoke calibration ${reference}`}
      description={`It can no longer be relied on, and that cannot be taken back. ${touched}`}
      action={revokeCalibrationAction}
      schema={revokeCalibrationInput}
      fields={{ calibrationId }}
      submitLabel={`Revoke ${reference}`}
      submitKind="danger"
    />
  );
}
