"use client";
import { useRouter } from "next/navigation";
import { AlertDialog } from "radix-ui";
import { useState } from "react";
import { buttonStyle } from "../button-style";
import { dialogStyle, overlayStyle } from "../layout/dialog-style";
import { useUnsaved } from "./use-unsaved";

type Props = {
  formId: string;
  /** Changes when the server has taken the form; typed text is then safe. */
  saved: unknown;
};

/** Asks before a page with typed, unsent text is left, by link as well as by closing the tab. */
export function UnsavedGuard({ formId, saved }: Props) {
  const [leadingTo, setLeadingTo] = useState<string | null>(null);
  const router = useRouter();
  const forget = useUnsaved({ formId, saved, onLeave: setLeadingTo });

  function leave() {
    forget();
    if (leadingTo) router.push(leadingTo);
    setLeadingTo(null);
  }

  return (
    <AlertDialog.Root open={leadingTo !== null} onOpenChange={(open) => !open && setLeadingTo(null)}>
      <AlertDialog.Portal>
        <AlertDialog.Overlay className={overlayStyle} />
        <AlertDialog.Content className={dialogStyle}>
          <AlertDialog.Title className="text-large font-semibold">Leave without saving?</AlertDialog.Title>
          <AlertDialog.Description className="mt-1 text-ink-2">
            What you typed on this page has not been saved.
          </AlertDialog.Description>
          <div className="mt-4 flex flex-wrap justify-end gap-2">
            <AlertDialog.Cancel className={buttonStyle("primary")}>Stay here</AlertDialog.Cancel>
            <AlertDialog.Action className={buttonStyle("plain")} onClick={leave}>
              Leave
            </AlertDialog.Action>
          </div>
        </AlertDialog.Content>
      </AlertDialog.Portal>
    </AlertDialog.Root>
  );
}
