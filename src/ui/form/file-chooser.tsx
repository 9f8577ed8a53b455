"use client";
import { type ReactNode, useRef } from "react";
import { buttonStyle } from "../button-style";
import { classNames } from "../class-names";

type Props = {
  accept?: string;
  multiple?: boolean;
  /** Opens the camera at the back. */
  capture?: boolean;
  describedBy?: string;
  className?: string;
  onTake: (files: File[]) => void;
  children: ReactNode;
};

/** A button that opens the browser's own choice of files. */
export function FileChooser({ accept, multiple, capture, describedBy, className, onTake, children }: Props) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <button
        type="button"
        aria-describedby={describedBy}
        onClick={() => input.current?.click()}
        className={classNames(buttonStyle(), className)}
      >
        {children}
      </button>
      <input
        ref={input}
        type="file"
        hidden
        tabIndex={-1}
        aria-hidden="true"
        accept={accept}
        multiple={multiple}
        capture={capture ? "environment" : undefined}
        onChange={(event) => {
          onTake([...(event.target.files ?? [])]);
          // The same file may be chosen again.
          event.target.value = "";
        }}
      />
    </>
  );
}
