import { classNames } from "./class-names";

export type ButtonKind = "primary" | "plain" | "quiet" | "danger";
export type ButtonSize = "normal" | "small" | "large";

const kinds: Record<ButtonKind, string> = {
  primary:
    "border-petrol bg-petrol text-on-petrol hover:not-disabled:border-petrol-strong hover:not-disabled:bg-petrol-strong",
  plain: "border-hair bg-sheet text-ink hover:not-disabled:border-edge hover:not-disabled:bg-raised",
  quiet:
    "border-transparent bg-transparent text-ink-2 hover:not-disabled:bg-hair-2 hover:not-disabled:text-ink",
  danger:
    "border-out bg-out text-on-out hover:not-disabled:border-out-strong hover:not-disabled:bg-out-strong",
};

const sizes: Record<ButtonSize, string> = {
  small: "px-2.5 py-1 text-small",
  normal: "px-3.5 py-[7px] text-body",
  large: "min-h-11 px-5 py-2.5 text-large",
};

/** The look of a button, for buttons and for links that act like one. */
export function buttonStyle(kind: ButtonKind = "plain", size: ButtonSize = "normal"): string {
  return classNames(
    "touch-target inline-flex items-center justify-center gap-2 rounded-control border font-medium whitespace-nowrap no-underline transition-colors",
    "disabled:cursor-not-allowed disabled:opacity-60 aria-disabled:cursor-not-allowed aria-disabled:opacity-60",
    kinds[kind],
    sizes[size],
  );
}
