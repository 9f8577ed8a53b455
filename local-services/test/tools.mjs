import { findProgram, installSystemPackages } from "../system-packages.mjs";

const tools = {
  pdf: [
    { program: "pdftotext", packages: ["poppler-utils"] },
    { program: "qpdf", packages: ["qpdf"] },
  ],
  browser: [{ program: "chromium", packages: ["chromium", "fonts-liberation"] }],
};

/** Programs of the system that the chosen parts cannot do without. */
export async function ensureTools(kinds) {
  const missing = [...new Set(kinds)]
    .flatMap((kind) => tools[kind])
    .filter(({ program }) => !findProgram(program));
  if (missing.length === 0) return "there";
  const names = missing.map(({ program }) => program).join(", ");
  await installSystemPackages(
    missing.flatMap(({ packages }) => packages),
    `The tests need ${names}`,
  );
  return `installed ${names}`;
}
