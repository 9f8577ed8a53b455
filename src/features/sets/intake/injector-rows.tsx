"use client";
import { type ClipboardEvent, type KeyboardEvent, useRef } from "react";
import type { KnownInjector } from "@/data/sets";
import { InjectorRow } from "./injector-row";
import { changed, filledDown, type IntakeRow, pastedSerials, repeatedSerials } from "./rows";

type Props = {
  rows: IntakeRow[];
  onChange: (rows: IntakeRow[]) => void;
  errorsOf: (name: string) => string[] | undefined;
  knownBy: (serial: string) => KnownInjector | undefined;
  /** The number of the set that is being edited. */
  ownNumber?: string;
  /** Where Enter leads from the last serial. */
  onLastEnter?: () => void;
};

/**
 * The injectors of a set as they are typed. Enter and the arrows go from serial to serial, a pasted column fills the rows
 * below, Ctrl+D copies a condition down.
 */
export function InjectorRows({ rows, onChange, errorsOf, knownBy, ownNumber, onLastEnter }: Props) {
  const place = useRef<HTMLUListElement>(null);
  const repeated = repeatedSerials(rows);

  function toSerial(at: number) {
    const inputs = place.current?.querySelectorAll<HTMLInputElement>("[data-serial]");
    const next = inputs?.[at];
    if (next) next.select();
    else if (at >= rows.length) onLastEnter?.();
  }

  function press(event: KeyboardEvent, at: number) {
    const step = { Enter: 1, ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (!step || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    toSerial(event.shiftKey && event.key === "Enter" ? at - 1 : at + step);
  }

  function paste(event: ClipboardEvent, row: IntakeRow) {
    const filled = pastedSerials(rows, row.key, event.clipboardData.getData("text/plain"));
    if (!filled) return;
    event.preventDefault();
    onChange(filled);
  }

  return (
    <ul ref={place} className="flex flex-col divide-y divide-hair-2">
      {rows.map((row, at) => (
        <InjectorRow
          key={row.key}
          row={row}
          at={at}
          sameAs={repeated[at] ?? null}
          known={knownBy(row.serial)}
          ownNumber={ownNumber}
          errorsOf={errorsOf}
          onChange={(part) => onChange(changed(rows, row.key, part))}
          onFillDown={at < rows.length - 1 ? () => onChange(filledDown(rows, row.key)) : null}
          onRemove={rows.length > 1 ? () => onChange(rows.filter((other) => other !== row)) : null}
          onSerialKey={(event) => press(event, at)}
          onSerialPaste={(event) => paste(event, row)}
        />
      ))}
    </ul>
  );
}
