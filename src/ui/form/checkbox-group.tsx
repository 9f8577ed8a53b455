"use client";
import { classNames } from "../class-names";
import { choiceStyle, tickStyle } from "./choice-style";
import { Group } from "./group";
import { asOptions, type Options } from "./options";
import { type FieldProps, useField } from "./use-field";

type Props = FieldProps & {
  options: Options;
  /** Chosen at first, outside a form. */
  defaultChosen?: readonly string[];
  layout?: "row" | "column";
};

/** Any number of a short list. */
export function CheckboxGroup({ options, defaultChosen, layout = "row", ...props }: Props) {
  const { frame, control, key, defaults } = useField(props);
  const chosen = defaultChosen ?? defaults.options;
  return (
    <Group {...frame}>
      <div key={key} className={classNames("flex gap-x-5", layout === "row" ? "flex-wrap" : "flex-col")}>
        {asOptions(options).map(({ value, label, disabled }) => (
          <label key={value} className={choiceStyle}>
            <input
              type="checkbox"
              name={control.name}
              value={value}
              disabled={disabled}
              defaultChecked={chosen.includes(value)}
              className={tickStyle}
            />
            {label}
          </label>
        ))}
      </div>
    </Group>
  );
}
