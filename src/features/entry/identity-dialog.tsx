"use client";
import { Dialog } from "radix-ui";
import { type FormEvent, type ReactNode, useRef, useState, useTransition } from "react";
import { buttonStyle } from "@/ui/button-style";
import { Button } from "@/ui/form/button";
import { IdentityGate } from "@/ui/form/identity-gate";
import { TextInput } from "@/ui/form/text-input";
import { dialogStyle, overlayStyle } from "@/ui/layout/dialog-style";
import { confirmIdentityAction } from "./actions";

/** Asks for the password again where a form needs it, and lets the form go on once it was right. */
export function IdentityDialog({ children }: { children: ReactNode }) {
  const [open, setOpen] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const [pending, startTransition] = useTransition();
  const answer = useRef<(confirmed: boolean) => void>(null);

  function ask(): Promise<boolean> {
    setProblem(null);
    setOpen(true);
    return new Promise((resolve) => {
      answer.current = resolve;
    });
  }

  function close(confirmed: boolean): void {
    setOpen(false);
    answer.current?.(confirmed);
    answer.current = null;
  }

  function submit(event: FormEvent<HTMLFormElement>): void {
    event.preventDefault();
    // The dialog stands in the page of another form, which must not be sent by this one.
    event.stopPropagation();
    const password = String(new FormData(event.currentTarget).get("password") ?? "");
    startTransition(async () => {
      const said = await confirmIdentityAction(password).catch(
        () => "The lab's server did not answer. Please try again.",
      );
      startTransition(() => (said === null ? close(true) : setProblem(said)));
    });
  }

  return (
    <IdentityGate confirm={ask}>
      {children}
      <Dialog.Root open={open} onOpenChange={(now) => (now ? null : close(false))}>
        <Dialog.Portal>
          <Dialog.Overlay className={overlayStyle} />
          <Dialog.Content className={dialogStyle} onInteractOutside={(event) => event.preventDefault()}>
            <Dialog.Title className="text-large font-semibold">Please enter your password again</Dialog.Title>
            <Dialog.Description className="mt-1 text-ink-2">
              This step is signed with your name, and you entered your password more than 15 minutes ago.
            </Dialog.Description>
            <form onSubmit={submit} className="mt-3 flex flex-col gap-2.5" aria-busy={pending || undefined}>
              <TextInput
                name="password"
                label="Password"
                type="password"
                autoComplete="current-password"
                errors={problem ? [problem] : undefined}
              />
              <div className="flex flex-wrap justify-end gap-2">
                <Dialog.Close className={buttonStyle("plain")}>Cancel</Dialog.Close>
                <Button type="submit" kind="primary" disabled={pending}>
                  {pending ? "Checking" : "Confirm"}
                </Button>
              </div>
            </form>
          </Dialog.Content>
        </Dialog.Portal>
      </Dialog.Root>
    </IdentityGate>
  );
}
