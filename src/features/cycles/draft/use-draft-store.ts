"use client";
import { useEffect, useState, useSyncExternalStore } from "react";
import useSWR from "swr";
import type { DraftFields } from "../../../data/cycles/draft-fields";
import { DraftStore } from "./draft-store";
import { type DraftChanges, fetchChanges, takeChanges } from "./fetch-changes";

type Opened = { draftId: string; version: number; fields: DraftFields; savedAt: string };
const everyMs = 4000;

/** The draft's store, kept in step with the device, the server and what others type. */
export function useDraftStore(opened: Opened) {
  const [store] = useState(() => new DraftStore(opened.draftId, opened));
  const snapshot = useSyncExternalStore(store.subscribe, store.snapshot, store.snapshot);
  const others = useOthers(store, snapshot.status === "closed");

  useEffect(() => {
    store.restore();
    const hidden = () => document.visibilityState === "hidden" && void store.flush(true);
    const again = () => void store.flush();
    document.addEventListener("visibilitychange", hidden);
    window.addEventListener("online", again);
    window.addEventListener("focus", again);
    return () => {
      document.removeEventListener("visibilitychange", hidden);
      window.removeEventListener("online", again);
      window.removeEventListener("focus", again);
      void store.flush(true);
    };
  }, [store]);

  return { store, snapshot, others };
}

/** Asks every few seconds, while the page is looked at, what others did to the sheet. */
function useOthers(store: DraftStore, closed: boolean): DraftChanges | undefined {
  const { data } = useSWR<DraftChanges>(closed ? null : store.draftId, () => fetchChanges(store), {
    refreshInterval: everyMs,
    shouldRetryOnError: true,
    errorRetryInterval: everyMs,
  });

  useEffect(() => {
    if (data) takeChanges(store, data);
  }, [data, store]);

  return data;
}
