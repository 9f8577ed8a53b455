"use client";
import { Search } from "lucide-react";
import { useEffect, useEffectEvent, useState } from "react";
import { controlStyle } from "./control-style";

type Props = {
  label: string;
  placeholder?: string;
  value: string;
  /** Told shortly after the typing stopped. */
  onSearch: (query: string) => void;
};

const pauseMs = 250;

/** A search box over a list. */
export function SearchInput({ label, placeholder, value, onSearch }: Props) {
  const [typed, setTyped] = useState(value);
  const tell = useEffectEvent(onSearch);
  useEffect(() => {
    const timer = setTimeout(() => tell(typed.trim()), pauseMs);
    return () => clearTimeout(timer);
  }, [typed]);
  return (
    <search className="relative mb-2.5 block max-w-96">
      <Search
        aria-hidden="true"
        size={15}
        className="pointer-events-none absolute top-[10px] left-2.5 text-ink-2"
      />
      <input
        type="search"
        aria-label={label}
        placeholder={placeholder}
        autoComplete="off"
        maxLength={160}
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
        className={`${controlStyle} pl-8`}
      />
    </search>
  );
}
