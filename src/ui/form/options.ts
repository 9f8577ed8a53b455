export type Option = { value: string; label: string; disabled?: boolean };

/** A list of words is a list of options that read as they are stored. */
export type Options = readonly (Option | string)[];

export function asOptions(options: Options): Option[] {
  return options.map((option) => (typeof option === "string" ? { value: option, label: option } : option));
}
