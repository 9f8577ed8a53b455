"use client";
import { type KeyboardEvent, type ReactNode, useRef, useState } from "react";
import { ComboboxList } from "./combobox-list";
import type { ComboboxOption } from "./combobox-option";
import { controlStyle } from "./control-style";
import { Field } from "./field";
import { type FieldProps, useField } from "./use-field";
import { type Search, useSearch } from "./use-search";

type Props = FieldProps & {
  search: Search;
  /** Chosen at first. */
  initial?: ComboboxOption | null;
  onChoose?: (option: ComboboxOption | null) => void;
  /** Offers to make a new one from what was typed. */
  onCreate?: (query: string) => void;
  createLabel?: (query: string) => ReactNode;
  placeholder?: string;
  autoFocus?: boolean;
};

/** Chooses one of many by typing. Down and Up move, Enter chooses, Escape closes and puts the text back. */
export function Combobox(props: Props) {
  const {
    search,
    initial = null,
    onChoose,
    onCreate,
    createLabel,
    placeholder,
    autoFocus,
    ...fieldProps
  } = props;
  const { frame, control, required } = useField(fieldProps);
  const [chosen, setChosen] = useState<ComboboxOption | null>(initial);
  const [query, setQuery] = useState(initial?.label ?? "");
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const hidden = useRef<HTMLInputElement>(null);
  const { options, failed, searching } = useSearch(query === chosen?.label ? "" : query.trim(), search, open);
  const creatable = Boolean(onCreate) && query.trim() !== "" && query !== chosen?.label;
  const count = options.length + (creatable ? 1 : 0);
  const listId = `${control.id}-list`;

  function put(option: ComboboxOption | null) {
    setChosen(option);
    setQuery(option?.label ?? "");
    close();
    onChoose?.(option);
    // The form hears of hidden inputs only when they are told to say so.
    queueMicrotask(() => hidden.current?.dispatchEvent(new Event("input", { bubbles: true })));
  }
  function close() {
    setOpen(false);
    setActive(-1);
  }
  function take(index: number) {
    const option = options[index];
    if (option) return put(option);
    if (!creatable) return;
    close();
    onCreate?.(query.trim());
  }
  function leave() {
    close();
    if (query.trim() === "" && chosen) put(null);
    else if (!creatable) setQuery(chosen?.label ?? "");
  }
  function press(event: KeyboardEvent) {
    if (event.key === "ArrowDown" || event.key === "ArrowUp") {
      event.preventDefault();
      const step = event.key === "ArrowDown" ? 1 : -1;
      if (!open) setOpen(true);
      else if (count > 0) setActive((at) => (at + step + count + (at < 0 && step < 0 ? 1 : 0)) % count);
    } else if (event.key === "Enter" && open) {
      event.preventDefault();
      take(active < 0 && count > 0 ? 0 : active);
    } else if (event.key === "Escape" && open) {
      event.preventDefault();
      event.stopPropagation();
      setQuery(chosen?.label ?? "");
      close();
    }
  }

  return (
    <Field {...frame}>
      <span className="relative">
        <input
          type="text"
          role="combobox"
          autoComplete="off"
          spellCheck={false}
          // biome-ignore lint/a11y/noAutofocus: the page asks for it where the first thing to do is to search
          autoFocus={autoFocus}
          placeholder={placeholder}
          value={query}
          onChange={(event) => {
            setQuery(event.target.value);
            setActive(-1);
            setOpen(true);
          }}
          onClick={() => setOpen(true)}
          onKeyDown={press}
          onBlur={leave}
          id={control.id}
          aria-required={required}
          aria-invalid={control["aria-invalid"]}
          aria-describedby={control["aria-describedby"]}
          aria-expanded={open}
          aria-controls={listId}
          aria-autocomplete="list"
          aria-activedescendant={active >= 0 ? `${listId}-${active}` : undefined}
          className={controlStyle}
        />
        <input ref={hidden} type="hidden" name={control.name} value={chosen?.value ?? ""} readOnly />
        {open ? (
          <ComboboxList
            id={listId}
            label={frame.label}
            options={options}
            chosen={chosen?.value}
            active={active}
            state={failed ? "failed" : searching ? "searching" : "settled"}
            create={creatable ? (createLabel?.(query.trim()) ?? `New: ${query.trim()}`) : null}
            onTake={take}
          />
        ) : null}
      </span>
    </Field>
  );
}
