"use client";
import { Minus, Plus } from "lucide-react";
import { mostInjectors } from "@/data/sets/inputs";
import { Button } from "@/ui/form/button";
import { controlStyle } from "@/ui/form/control-style";

type Props = { count: number; onChange: (count: number) => void };

/** How many injectors there are; the rows follow. */
export function CountStepper({ count, onChange }: Props) {
  return (
    <div className="flex items-center gap-1.5">
      <label htmlFor="injector-count" className="text-small font-medium whitespace-nowrap">
        How many
      </label>
      <Button size="small" disabled={count <= 1} onClick={() => onChange(count - 1)}>
        <Minus aria-hidden="true" size={14} />
        <span className="sr-only">One injector fewer</span>
      </Button>
      <input
        id="injector-count"
        type="text"
        inputMode="numeric"
        autoComplete="off"
        // A new key puts the count back where what was typed is no count.
        key={count}
        defaultValue={count}
        onFocus={(event) => event.target.select()}
        onBlur={(event) => take(event.target)}
        onKeyDown={(event) => {
          if (event.key === "Enter") {
            event.preventDefault();
            take(event.currentTarget);
          } else if (event.key === "ArrowUp") onChange(count + 1);
          else if (event.key === "ArrowDown") onChange(count - 1);
        }}
        className={`${controlStyle} max-w-14 text-center`}
      />
      <Button size="small" disabled={count >= mostInjectors} onClick={() => onChange(count + 1)}>
        <Plus aria-hidden="true" size={14} />
        <span className="sr-only">One injector more</span>
      </Button>
    </div>
  );

  function take(input: HTMLInputElement) {
    const typed = Number(input.value);
    if (Number.isInteger(typed) && typed >= 1 && typed <= mostInjectors) onChange(typed);
    else input.value = String(count);
  }
}
