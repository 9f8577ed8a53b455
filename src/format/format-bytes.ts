const units = ["B", "kB", "MB", "GB", "TB"];

/** In steps of 1000, as storage is sold: `980 B`, `1.4 MB`, `25 MB`. */
export function formatBytes(bytes: number): string {
  let size = bytes;
  let step = 0;
  while (size >= 999.5 && step < units.length - 1) {
    size /= 1000;
    step += 1;
  }
  const digits = step === 0 || size >= 9.95 ? size.toFixed(0) : size.toFixed(1).replace(/\.0$/, "");
  return `${digits} ${units[step]}`;
}
