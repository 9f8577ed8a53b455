"use client";
import { createContext, type ReactNode, useContext } from "react";

/** Asks for the password again; true once it was right. */
export type ConfirmIdentity = () => Promise<boolean>;

const IdentityGateContext = createContext<ConfirmIdentity | null>(null);

/** Whoever frames the page gives forms the dialog that asks for the password again. */
export function IdentityGate({ confirm, children }: { confirm: ConfirmIdentity; children: ReactNode }) {
  return <IdentityGateContext value={confirm}>{children}</IdentityGateContext>;
}

export function useIdentityGate(): ConfirmIdentity | null {
  return useContext(IdentityGateContext);
}
