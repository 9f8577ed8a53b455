"use client";
import useSWR from "swr";
import type { KnownInjector } from "@/data/sets";
import { sameSerial } from "@/data/sets/inputs";
import { useSettled } from "./use-settled";

async function ask(address: string): Promise<KnownInjector[]> {
  const response = await fetch(address);
  if (!response.ok) throw new Error(`The record answered ${response.status}`);
  return response.json();
}

/** What the record knows of serials, shortly after they were typed. */
export function useKnownSerials(modelId: string, serials: readonly string[]) {
  const asked = useSettled(
    serials
      .map((serial) => serial.trim())
      .filter(Boolean)
      .join("\n"),
    300,
  );
  const query = new URLSearchParams({ modelId });
  for (const serial of asked.split("\n")) if (serial) query.append("serial", serial);
  const address = modelId && asked ? `/api/data/sets/known-injectors?${query}` : null;
  const { data } = useSWR(address, ask, { keepPreviousData: true, revalidateOnFocus: false });
  return (serial: string) =>
    serial.trim() ? data?.find((known) => sameSerial(known.serial, serial)) : undefined;
}
