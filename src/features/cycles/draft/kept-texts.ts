type Kept = { base: string; value: string };

/**
 * What was typed and not yet acknowledged, kept on this device: one entry per field, so that two tabs of one browser cannot
 * take each other's away. A browser without storage keeps nothing; typing goes on.
 */
const prefixOf = (draftId: string) => `evenrail.draft.${draftId}.`;

function storage(): Storage | null {
  try {
    return window.localStorage;
  } catch {
    return null;
  }
}

export function keptTexts(draftId: string): Record<string, Kept> {
  const device = storage();
  const prefix = prefixOf(draftId);
  const kept: Record<string, Kept> = {};
  for (let index = 0; index < (device?.length ?? 0); index++) {
    const key = device?.key(index) ?? "";
    if (!key.startsWith(prefix)) continue;
    const entry = readEntry(device?.getItem(key) ?? "");
    if (entry) kept[key.slice(prefix.length)] = entry;
  }
  return kept;
}

function readEntry(text: string): Kept | null {
  try {
    const { base, value } = JSON.parse(text) as Partial<Kept>;
    return typeof base === "string" && typeof value === "string" ? { base, value } : null;
  } catch {
    return null;
  }
}

/** False when the device has no room or no storage: then only the server's copy is safe. */
export function keepText(draftId: string, field: string, entry: Kept): boolean {
  try {
    const device = storage();
    device?.setItem(prefixOf(draftId) + field, JSON.stringify(entry));
    return device !== null;
  } catch {
    return false;
  }
}

/** Lets go of a text once the server has it, unless another one was typed meanwhile. */
export function letGo(draftId: string, field: string, value?: string): void {
  const device = storage();
  const key = prefixOf(draftId) + field;
  const entry = readEntry(device?.getItem(key) ?? "");
  if (value === undefined || entry?.value === value) device?.removeItem(key);
}
