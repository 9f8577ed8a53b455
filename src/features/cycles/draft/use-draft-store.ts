"use client";
import { useEffect, useState, useSyncExternalStore } from "react";
import useSWR from "swr";
import type { DraftFields } from "../../../data/cycles/draft-fields";
import { DraftStore } from "./draft-store";

type Opened = { draftId: string; version: number; fields: DraftFields; savedAt: string };
type Changes = {
  version: number;
  fields: DraftFields | null;
  savedBy: string;
  closed: "recorded" | "put away" | null;
};

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
function useOthers(store: DraftStore, closed: boolean): Changes | undefined {
  const { data } = useSWR<Changes>(closed ? null : store.draftId, fetchChanges, {
    refreshInterval: everyMs,
    shouldRetryOnError: true,
    errorRetryInterval: everyMs,
  });

  async function fetchChanges(draftId: string): Promise<Changes> {
    const { version } = store.snapshot().state;
    const response = await fetch(`/api/data/drafts/${draftId}?version=${version}`);
    if (!response.ok) throw new Error(`answer ${response.status}`);
    return (await response.json()) as Changes;
  }

  useEffect(() => {
    if (!data) return;
    if (data.closed) store.close(`This sheet was ${data.closed} by ${data.savedBy}.`);
    else store.takeOthers(data);
  }, [data, store]);

  return data;
}
