"use client";
import { classNames } from "../class-names";
import { choiceStyle, tickStyle } from "./choice-style";
import { Group } from "./group";
import { asOptions, type Options } from "./options";
import { type FieldProps, useField } from "./use-field";

type Props = FieldProps & {
  options: Options;
  /** Chosen at first, outside a form. */
  defaultChosen?: string;
  onChoose?: (value: string) => void;
  layout?: "row" | "column";
};

/** One of a short list, all of it in sight. */
export function RadioGroup({ options, defaultChosen, onChoose, layout = "row", ...props }: Props) {
  const { frame, control, key, defaults } = useField(props);
  const chosen = defaultChosen ?? defaults.value;
  return (
    <Group {...frame} role="radiogroup">
      <div key={key} className={classNames("flex gap-x-5", layout === "row" ? "flex-wrap" : "flex-col")}>
        {asOptions(options).map(({ value, label, disabled }) => (
          <label key={value} className={choiceStyle}>
            <input
              type="radio"
              name={control.name ?? control.id}
              value={value}
              disabled={disabled}
              defaultChecked={chosen === value}
              onChange={() => onChoose?.(value)}
              className={tickStyle}
            />
            {label}
          </label>
        ))}
      </div>
    </Group>
  );
}
