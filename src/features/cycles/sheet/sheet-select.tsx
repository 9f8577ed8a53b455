"use client";
import type { Options } from "../../../ui/form/options";
import { Select } from "../../../ui/form/select";
import { useSheet } from "./sheet-context";

type Props = {
  label: string;
  field: string;
  options: Options;
  missing?: string;
  /** Takes the place of plain setting, where a choice brings other fields along. */
  onChoose?: (value: string) => void;
};

export function SheetSelect({ label, field, options, missing, onChoose }: Props) {
  const { fields, readOnly, edit } = useSheet();
  const text = fields[field] ?? "";
  return (
    <Select
      label={label}
      value={text}
      options={options}
      placeholder="Please choose"
      disabled={readOnly}
      errors={text === "" && missing ? [missing] : undefined}
      onChange={({ target }) => (onChoose ? onChoose(target.value) : edit([{ field, value: target.value }]))}
    />
  );
}
