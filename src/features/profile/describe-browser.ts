const browsers: [RegExp, string][] = [
  [/\bEdgA?\//, "Edge"],
  [/\b(OPR|Opera)\//, "Opera"],
  [/\bSamsungBrowser\//, "Samsung Internet"],
  [/\b(Firefox|FxiOS)\//, "Firefox"],
  [/\b(Chrome|CriOS|Chromium|HeadlessChrome)\//, "Chrome"],
  [/\bSafari\//, "Safari"],
];
const systems: [RegExp, string][] = [
  [/\biPhone\b/, "iPhone"],
  [/\biPad\b/, "iPad"],
  [/\bAndroid\b/, "Android"],
  [/\bWindows\b/, "Windows"],
  [/\bMac OS X\b/, "macOS"],
  [/\bCrOS\b/, "ChromeOS"],
  [/\bLinux\b/, "Linux"],
];

/** “Firefox on Windows”, or what the browser says of itself where that is not known. */
export function describeBrowser(userAgent: string): string {
  const nameIn = (known: [RegExp, string][]) => known.find(([pattern]) => pattern.test(userAgent))?.[1];
  const [browser, system] = [nameIn(browsers), nameIn(systems)];
  if (!browser) return userAgent || "unknown browser";
  return system ? `${browser} on ${system}` : browser;
}
