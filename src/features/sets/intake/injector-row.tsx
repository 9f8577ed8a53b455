"use client";
import { ChevronsDown, Trash2 } from "lucide-react";
import type { ClipboardEvent, KeyboardEvent } from "react";
import type { InjectorCondition, KnownInjector } from "@/data/sets";
import { injectorConditions } from "@/db/vocabulary";
import { classNames } from "@/ui/class-names";
import { Button } from "@/ui/form/button";
import { controlStyle } from "@/ui/form/control-style";
import { RowRemark } from "./row-remark";
import type { IntakeRow } from "./rows";

type Props = {
  row: IntakeRow;
  at: number;
  sameAs: number | null;
  known: KnownInjector | undefined;
  ownNumber?: string;
  errorsOf: (name: string) => string[] | undefined;
  onChange: (part: Partial<IntakeRow>) => void;
  onFillDown: (() => void) | null;
  onRemove: (() => void) | null;
  onSerialKey: (event: KeyboardEvent) => void;
  onSerialPaste: (event: ClipboardEvent) => void;
};

export function InjectorRow(props: Props) {
  const { row, at, onChange, onFillDown, onRemove, errorsOf } = props;
  const name = (field: string) => `injectors[${at}].${field}`;
  const label = (words: string) => `${words} of injector ${at + 1}`;
  const errors = [
    ...(errorsOf(name("serial")) ?? []),
    ...(errorsOf(name("marking")) ?? []),
    ...(errorsOf(name("condition")) ?? []),
    ...(errorsOf(name("conditionNote")) ?? []),
  ];
  const open = props.known?.openSet;
  const wrongSerial = props.sameAs !== null || Boolean(open && open !== props.ownNumber) || errors.length > 0;

  function conditionKey(event: KeyboardEvent) {
    if (!(event.ctrlKey || event.metaKey) || event.key.toLowerCase() !== "d") return;
    event.preventDefault();
    onFillDown?.();
  }

  return (
    <li className={classNames(rowStyle, row.notReceived && "opacity-60")}>
      <span className="self-center font-semibold">
        {row.tag ?? at + 1}
        {row.setInjectorId ? (
          <input type="hidden" name={name("setInjectorId")} value={row.setInjectorId} readOnly />
        ) : null}
      </span>
      <input
        data-serial
        name={name("serial")}
        aria-label={label("Serial")}
        aria-invalid={wrongSerial || undefined}
        aria-describedby={`row-${row.key}-remark`}
        placeholder="Serial"
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        value={row.serial}
        onChange={(event) => onChange({ serial: event.target.value })}
        onKeyDown={props.onSerialKey}
        onPaste={props.onSerialPaste}
        className={controlStyle}
      />
      <input
        name={name("marking")}
        aria-label={label("Marking")}
        placeholder="Marking"
        autoComplete="off"
        value={row.marking}
        onChange={(event) => onChange({ marking: event.target.value })}
        className={controlStyle}
      />
      <span className="flex gap-1">
        <select
          name={name("condition")}
          aria-label={label("Condition")}
          aria-keyshortcuts="Control+D"
          value={row.condition}
          onChange={(event) => onChange({ condition: event.target.value as InjectorCondition })}
          onKeyDown={conditionKey}
          className={controlStyle}
        >
          {injectorConditions.map((condition) => (
            <option key={condition}>{condition}</option>
          ))}
        </select>
        <Button
          kind="quiet"
          size="small"
          disabled={!onFillDown}
          tabIndex={-1}
          onClick={() => onFillDown?.()}
          title="The same condition for all below (Ctrl+D)"
        >
          <ChevronsDown aria-hidden="true" size={15} />
          <span className="sr-only">The same condition for all below injector {at + 1}</span>
        </Button>
      </span>
      <input
        name={name("conditionNote")}
        aria-label={label("Note on the condition")}
        placeholder="Note on its condition"
        autoComplete="off"
        value={row.conditionNote}
        onChange={(event) => onChange({ conditionNote: event.target.value })}
        className={controlStyle}
      />
      <span id={`row-${row.key}-remark`} aria-live="polite" className="self-center text-small">
        <RowRemark sameAs={props.sameAs} known={props.known} ownNumber={props.ownNumber} errors={errors} />
      </span>
      <span className="self-center justify-self-end">
        {row.setInjectorId ? (
          <label className="touch-target flex items-center gap-1.5 text-small whitespace-nowrap">
            <input
              type="checkbox"
              name={name("notReceived")}
              checked={row.notReceived}
              onChange={(event) => onChange({ notReceived: event.target.checked })}
            />
            not in the parcel
          </label>
        ) : (
          <Button kind="quiet" size="small" tabIndex={-1} disabled={!onRemove} onClick={() => onRemove?.()}>
            <Trash2 aria-hidden="true" size={15} />
            <span className="sr-only">Remove injector {at + 1}</span>
          </Button>
        )}
      </span>
    </li>
  );
}

/** One line on a wide page; on a phone two columns with the serial across. */
const rowStyle = classNames(
  "grid grid-cols-[2rem_1fr_1fr] gap-x-2 gap-y-1.5 py-2",
  "max-laptop:*:nth-2:col-span-2 max-laptop:*:nth-3:col-start-2 max-laptop:*:nth-5:col-span-2 max-laptop:*:nth-5:col-start-2",
  "max-laptop:*:nth-6:col-start-2",
  "laptop:grid-cols-[minmax(2rem,auto)_minmax(7rem,1.1fr)_minmax(6rem,0.8fr)_12rem_minmax(8rem,1.3fr)_minmax(9rem,1fr)_auto] laptop:py-1",
);
