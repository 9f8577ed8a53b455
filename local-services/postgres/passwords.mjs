import { randomBytes } from "node:crypto";
import { readFileSync, renameSync, writeFileSync } from "node:fs";
import { join } from "node:path";

/** Roles of a cluster. The superuser only sets up; the owner migrates; the application has no right to change tables. */
export const roles = { superuser: "evenrail_superuser", owner: "evenrail_owner", app: "evenrail_app" };

/** Made once, readable by nobody else. */
export function passwordsOf(folder) {
  const path = join(folder, "passwords.json");
  try {
    return JSON.parse(readFileSync(path, "utf8"));
  } catch (error) {
    if (error.code !== "ENOENT") throw error;
  }
  const passwords = Object.fromEntries(
    Object.keys(roles).map((role) => [role, randomBytes(24).toString("base64url")]),
  );
  writeFileSync(`${path}.new`, JSON.stringify(passwords), { mode: 0o600 });
  renameSync(`${path}.new`, path);
  return passwords;
}
