"use client";
import { classNames } from "../class-names";

type Props = {
  label: string;
  series: readonly { key: string; label: string }[];
  chosen: string | null;
  onChoose: (key: string | null) => void;
};

/** One button per series: makes it stand out, or gives all back their weight. */
export function HighlightChips({ label, series, chosen, onChoose }: Props) {
  return (
    <fieldset className="flex flex-wrap gap-1 print:hidden">
      <legend className="sr-only">{label}</legend>
      {series.map(({ key, label: name }) => (
        <button
          key={key}
          type="button"
          aria-pressed={key === chosen}
          onClick={() => onChoose(key === chosen ? null : key)}
          className={classNames(
            "min-w-6 rounded-mark border px-1.5 text-small pointer-coarse:min-h-11 pointer-coarse:min-w-11",
            key === chosen
              ? "border-petrol bg-petrol text-on-petrol"
              : "border-hair text-ink-2 hover:border-edge hover:text-ink",
          )}
        >
          {name}
        </button>
      ))}
    </fieldset>
  );
}
