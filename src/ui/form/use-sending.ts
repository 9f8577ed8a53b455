"use client";
import { useActionState, useEffect, useEffectEvent, useRef, useState, useTransition } from "react";
import { useIdentityGate } from "./identity-gate";
import { newKey } from "./new-key";
import type { FormAction, FormReply } from "./reply";
import { sendForm } from "./send-form";

/**
 * Sends what a form holds. React empties a form whose `action` it runs itself, so it only runs it where there is no
 * script; otherwise the form is sent from here and keeps what was typed.
 */
export function useSending(action: FormAction, onReply?: (reply: FormReply) => void) {
  const [unscripted, formAction] = useActionState(action, undefined);
  const [sent, setSent] = useState<FormReply>();
  const [pending, startTransition] = useTransition();
  const [idempotencyKey, setKey] = useState(newKey);
  const lastData = useRef<FormData>(null);
  const reply = sent ?? unscripted;

  function send(data: FormData) {
    if (pending) return;
    lastData.current = data;
    startTransition(async () => {
      const next = await sendForm(action, reply, data);
      startTransition(() => {
        setSent(next);
        // The next write is another write, so it gets a key of its own.
        if (next.status === "success") setKey(newKey());
        onReply?.(next);
      });
    });
  }

  function sendAgain() {
    if (lastData.current) send(lastData.current);
  }

  const confirmIdentity = useIdentityGate();
  const askWho = useEffectEvent(async () => {
    if (await confirmIdentity?.()) sendAgain();
  });
  useEffect(() => {
    if (reply?.confirmWhoYouAre) void askWho();
  }, [reply]);

  return { reply, pending, idempotencyKey, formAction, send, sendAgain };
}
